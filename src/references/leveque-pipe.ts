import { levequeLayer } from './leveque-layer.ts';

export const levequePipe = levequeLayer({
  flow: 'pipe',
  where: 'in a round pipe',
  ratio: [8, 9],
  next: 0.743,
  from: 4e5,
  limitIs: '0.7 % high at Gz 1e6, 2 % at 5e4, 3 % at 1e4',
});
