import { quantity, way, type Definition } from '../workings/index.ts';
import { factor } from './factor.ts';

/** Saturation pressure over liquid water [Pa] at T [K]: Alduchov and Eskridge, within 0.1 % from 0 to 50 degC. */
const saturated = (T: number): number => 610.94 * Math.exp((17.625 * (T - 273.15)) / (T - 273.15 + 243.04));

/** Share of vapour by mass at a partial pressure. */
const share = (vapour: number, pressure: number): number => (0.62198 * vapour) / (pressure - 0.37802 * vapour);

const heated = { medium: 'gas', moisture: 'humid', energySolved: 'yes' } as const;

/** Heat that vapour brings to a wall below the dew point, by the analogy of heat and mass transfer. */
export const condensation: Definition[] = [
  quantity('latentShare', { symbol: 's_L', name: 'latent heat at the wall over the convective', unit: '1' }, [
    way({
      needs: ['fluid.humidity', 'farTemperature', 'wallTemperature', 'filmTemperature', 'pressure', 'thermalDiffusivityFilm', 'specificHeatCapacityFilm'],
      when: heated,
      range: { farTemperature: [273.15, 323.15], wallTemperature: [273.15, 323.15] },
      scatter: 0.12,
      value: (of) => {
        const fall = of.farTemperature - of.wallTemperature;
        const [far, wall] = [of['fluid.humidity'] * saturated(of.farTemperature), saturated(of.wallTemperature)];
        if (!(fall > 0 && far > wall)) return 0;
        const lewis = of.thermalDiffusivityFilm / (1.87e-10 * of.filmTemperature ** 2.072 * (101325 / of.pressure));
        const atWall = share(wall, of.pressure);
        const latent = 2.501e6 - 2361 * (of.wallTemperature - 273.15);
        return ((latent / of.specificHeatCapacityFilm) * lewis ** (-2 / 3) * (share(far, of.pressure) - atWall)) / ((1 - atWall) * fall);
      },
      formula: 's_L = (h_fg/cp) Le^(-2/3) (Y_far - Y_w)/((1 - Y_w)(T_far - T_w)), Y_w saturated, Le = alpha/D',
      source: 'Chilton and Colburn, Ind. Eng. Chem. 26 (1934) 1183; D of Marrero and Mason, J. Phys. Chem. Ref. Data 1 (1972) 3; saturation of Alduchov and Eskridge, J. Appl. Meteor. 35 (1996) 601',
      note: 'a wet wall at its given temperature: the film of water is thin; below 0 degC frost forms',
      dimensional: 'laws of water hold constants with units',
    }),
  ]),
  ...factor('condensationFactorHeat', { symbol: 'F_L', name: 'heat from the wall with condensation over that without' }, [
    way({ needs: ['latentShare', 'radiationFactorHeat'], when: heated, value: ({ latentShare, radiationFactorHeat }) => 1 + latentShare / radiationFactorHeat, formula: 'F_L = 1 + s_L/F_r', source: 'sum of the fluxes' }),
  ]),
];
