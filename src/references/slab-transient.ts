import { bodyTransient } from './body-transient.ts';

export const slabTransient = bodyTransient('slab', { title: 'Slab cooled or heated through both faces', half: 'half thickness', condition: 'lambda tan lambda = Bi' });
