import { bodyTransient } from './body-transient.ts';

export const cylinderTransient = bodyTransient('cylinder', { title: 'Long cylinder cooled or heated through its surface', half: 'radius', condition: 'lambda J1(lambda)/J0(lambda) = Bi' });
