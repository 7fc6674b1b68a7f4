export { largestFile, readResultText, textOf } from './bytes.ts';
export { csvRows, delimiterOf, type Cell, type Delimiter } from './csv.ts';
export { meshFamily, type FineBy, type MeshFamily, type Target } from './family.ts';
export { indexOfName, isTemperature, type Head } from './header.ts';
export { asymptoticRatio, judgeFamily, type GridKind, type GridNumbers, type Held } from './judge.ts';
export { leastSquares, type LeastSquares } from './leastSquares.ts';
export { apparentOrder, extrapolate, indexHalfWidth, tripletKind, type Triplet, type TripletKind } from './order.ts';
export { readTable, type Column, type Table } from './table.ts';
