import { bodyTransient } from './body-transient.ts';

export const sphereTransient = bodyTransient('sphere', { title: 'Sphere cooled or heated through its surface', half: 'radius', condition: '1 - lambda cot lambda = Bi' });
