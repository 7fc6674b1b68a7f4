import { levequeLayer } from './leveque-layer.ts';

export const levequeChannel = levequeLayer({
  flow: 'channel',
  where: 'between parallel plates',
  ratio: [4, 3],
  next: 0.2,
  from: 1e4,
  limitIs: 'within 1 % from Gz 1e4',
});
