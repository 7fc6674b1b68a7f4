import { quantity, way, type Definition } from '../workings/index.ts';

const definition = 'definition';

/** What bodies in a stream have beside friction and heat transfer: drag, the nearness of walls, the laminar part of their surface. A flow gives the laws. */
export const bodies: Definition[] = [
  quantity('laminarShare', { symbol: 's_lam', name: 'laminar share of the target surface', unit: '1' }),
  quantity('frontalArea', { symbol: 'A_f', name: 'area that the drag coefficient refers to', unit: 'm^2' }),
  quantity('dragCoefficientPlain', { symbol: 'C_D,0', name: 'drag coefficient without walls around, smooth, constant properties', unit: '1' }),
  quantity('dragCoefficientSecond', { symbol: 'C_D,2', name: 'drag coefficient by a second law', unit: '1' }),
  quantity('dragDisagreement', { symbol: 'C_D,2/C_D,0', name: 'second law of drag over the first', unit: '1' }, [
    way({ needs: ['dragCoefficientSecond', 'dragCoefficientPlain'], value: ({ dragCoefficientSecond, dragCoefficientPlain }) => dragCoefficientSecond / dragCoefficientPlain, formula: 'C_D,2/C_D,0', source: definition }),
  ]),
  quantity('dragForce', { symbol: 'F_D', name: 'drag', unit: 'N' }, [
    way({ needs: ['dragCoefficient', 'frontalArea', 'density', 'speed'], value: ({ dragCoefficient, frontalArea, density, speed }) => (dragCoefficient * frontalArea * density * speed ** 2) / 2, formula: 'F_D = C_D A_f rho U^2/2', source: definition }),
  ]),
  quantity('blockageSpeedRatio', { symbol: 'U_c/U', name: 'speed that the body meets between walls over that without', unit: '1' }, [
    way({ needs: [], value: () => 1, formula: 'U_c/U = 1', source: 'no walls around are given' }),
  ]),
  quantity('regionCoarsening', { symbol: 'a_c', name: 'cell of a region over that of the core', unit: '1', per: ['region'] }, [
    way({ needs: [], value: () => 1, formula: 'a_c = 1', source: 'common practice' }),
  ]),
];
