import { bodyTemperature, firstMode, type Shape } from './body-series.ts';
import { places, reference, type Reference } from './define.ts';

/** What tells one body from another in words; the series are told apart by the shape. */
interface Body {
  readonly title: string;
  /** The length that Biot and Fourier number are built on. */
  readonly half: string;
  /** Condition that the eigenvalues satisfy. */
  readonly condition: string;
}

/**
 * A body at uniform temperature put into a fluid of another temperature.
 *
 * @param shape  slab, long cylinder or sphere
 * @param body   its words
 * @returns      the reference `<shape>-transient`
 */
export const bodyTransient = (shape: Shape, { title, half, condition }: Body): Reference => reference(`${shape}-transient`, {
  title,
  kind: 'exact',
  assumes: ['one-dimensional', 'constant properties', 'uniform start temperature', 'uniform heat transfer coefficient and fluid temperature'],
  verifies: ['conduction', 'time accuracy', 'surface condition'],
  source: 'Carslaw and Jaeger, Conduction of Heat in Solids, 2nd ed. (1959)',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: `Biot and Fourier number on the ${half}; small first steps; coefficient on the outer face only`,
  flows: ['solid', 'pellet'],
  needs: [
    { id: 'biot', unit: '1', name: `Biot number h L/k on the ${half}` },
    { id: 'fourier', unit: '1', name: `Fourier number alpha t/L^2 on the ${half}`, range: [1e-4, 1e3] },
  ],
  values: [
    { id: 'eigenvalue', name: 'first eigenvalue', unit: '1', formula: condition, value: (g) => firstMode(shape, g.biot).lambda },
    { id: 'coefficient', name: 'first coefficient', unit: '1', formula: 'C_1 of the series', value: (g) => firstMode(shape, g.biot).coefficient },
    { id: 'centreTemperatureRatio', name: 'difference left in the middle over the start difference', unit: '1', formula: 'sum C_n exp(-lambda_n^2 Fo)', value: (g) => bodyTemperature(shape, g.biot, g.fourier, 0) },
    { id: 'surfaceTemperatureRatio', name: 'difference left at the surface over the start difference', unit: '1', formula: 'sum C_n exp(-lambda_n^2 Fo) f(lambda_n)', value: (g) => bodyTemperature(shape, g.biot, g.fourier, 1) },
    { id: 'meanTemperatureRatio', name: 'mean difference left over the start difference', unit: '1', formula: 'sum C_n exp(-lambda_n^2 Fo) <f>', value: (g) => bodyTemperature(shape, g.biot, g.fourier, 'mean') },
  ],
  tables: [
    {
      id: 'temperatureShape',
      title: 'Difference left over the start difference, from the middle to the surface',
      columns: [{ id: 'distance', name: 'x/L', unit: '1' }, { id: 'temperature', name: '(T - T_fluid)/(T_start - T_fluid)', unit: '1' }],
      rows: (g) => places(0, 1, 10).map((x) => [x, bodyTemperature(shape, g.biot, g.fourier, x)]),
    },
  ],
});
