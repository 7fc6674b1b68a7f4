import { quantity, way, type Definition } from '../workings/index.ts';
import { laminarMeanNusselt } from './correlations/index.ts';
import { factor } from './factor.ts';

const none = way({ needs: [], value: () => 1, formula: 'F = 1', source: 'the effect does not act here' });
const shahLondon = 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), mean Nusselt number of the thermal entrance';
const gnielinskiEntrance = 'entrance factor of Hausen, as in Gnielinski, Int. Chem. Eng. 16 (1976) 359';

/** Mean over developed Nusselt number of a wall with uniform flux in a round tube, x* = 1/Gz. */
const meanUniformFlux = (gz: number): number => (gz >= 1 / 0.03 ? 1.953 * Math.cbrt(gz) : 4.364 + 0.0722 * gz) / 4.364;
/** The same between plates that both give one flux, on the hydraulic diameter. */
const meanFluxBetweenPlates = (gz: number): number => (gz >= 1000 ? 2.236 * Math.cbrt(gz) : gz >= 100 ? 2.236 * Math.cbrt(gz) + 0.9 : 8.235 + 0.0364 * gz) / 8.235;
/** The same between plates of one temperature, on the hydraulic diameter. */
const meanBetweenPlates = (gz: number): number => (gz >= 2000 ? 1.849 * Math.cbrt(gz) : gz >= 1 / 0.006 ? 1.849 * Math.cbrt(gz) + 0.6 : 7.541 + 0.0235 * gz) / 7.541;

/** Weight of the laminar end between the regimes, 1 - g. */
const stillLaminar = ({ regimeGroup, regimeLow, regimeHigh }: { readonly regimeGroup: number; readonly regimeLow: number; readonly regimeHigh: number }): number => Math.min(1, Math.max(0, (regimeHigh - regimeGroup) / (regimeHigh - regimeLow)));

/** What the entrance adds to friction and heat transfer, and how long the passage is against it. */
export const entrance: Definition[] = [
  quantity('entranceRatio', { symbol: 'L/L_e', name: 'length over entrance length', unit: '1' }, [
    way({ needs: ['flowLength', 'entranceLength'], value: ({ flowLength, entranceLength }) => flowLength / entranceLength, formula: 'L/L_e', source: 'definition' }),
  ]),
  quantity('turbulentEntranceExcess', { symbol: '(D/L)^(2/3)', name: 'mean over developed heat transfer less one, turbulent', unit: '1' }, [
    way({ needs: ['hydraulicDiameter', 'flowLength'], scatter: 0.5, value: ({ hydraulicDiameter, flowLength }) => (hydraulicDiameter / flowLength) ** (2 / 3), formula: '(D_h/L)^(2/3)', source: gnielinskiEntrance }),
  ]),
  quantity('entranceFactorNusseltLaminar', { symbol: 'F_e,lam', name: 'mean over developed Nusselt number of laminar flow', unit: '1' }, [
    way({ needs: ['graetz'], when: { flowClass: 'internal', ductSection: 'flat', wallKind: 'flux' }, scatter: 0.05, range: { graetz: [0, 1e5] }, value: ({ graetz }) => meanFluxBetweenPlates(graetz), formula: 'F = (2.236 Gz^(1/3) + 0.9)/8.235, without 0.9 from Gz = 1000, (8.235 + 0.0364 Gz)/8.235 below 100', source: shahLondon }),
    way({ needs: ['graetz', 'prandtlBulk'], when: { flowClass: 'internal', wallKind: 'flux' }, scatter: 0.05, range: { graetz: [0, 1e5] }, value: ({ graetz }) => meanUniformFlux(graetz), formula: 'F = 1.953 Gz^(1/3)/4.364, (4.364 + 0.0722 Gz)/4.364 below Gz = 33', source: shahLondon, note: 'round tube; rectangular sections alike within the scatter' }),
    way({ needs: ['graetz'], when: { flowClass: 'internal', ductSection: 'flat' }, scatter: 0.05, range: { graetz: [0, 1e5] }, value: ({ graetz }) => meanBetweenPlates(graetz), formula: 'F = (1.849 Gz^(1/3) + 0.6)/7.541, (7.541 + 0.0235 Gz)/7.541 below Gz = 167', source: shahLondon }),
    way({ needs: ['graetz'], when: { flowClass: 'internal', inletProfile: 'developed' }, scatter: 0.03, range: { graetz: [0, 1e8] }, value: ({ graetz }) => laminarMeanNusselt({ graetz, prandtl: 1e12 }) / 3.657, formula: 'F = {3.657/tanh(2.264 Gz^(-1/3) + 1.7 Gz^(-2/3)) + 0.0499 Gz tanh(1/Gz)}/3.657', source: 'Baehr and Stephan, Heat and Mass Transfer, developed velocity profile; its limit for thin layers is that of Leveque' }),
    way({ needs: ['graetz', 'prandtlBulk'], when: { flowClass: 'internal' }, scatter: 0.05, range: { graetz: [0, 1e6], prandtlBulk: [0.1, 1e5] }, value: ({ graetz, prandtlBulk }) => laminarMeanNusselt({ graetz, prandtl: prandtlBulk }) / 3.657, formula: 'as for a developed profile, over tanh(2.432 Pr^(1/6) Gz^(-1/6))', source: 'Baehr and Stephan, Heat and Mass Transfer, simultaneous entrance; its limit for thin layers is that of a plate' }),
  ]),
  ...factor('entranceFactorNusselt', { symbol: 'F_e,Nu', name: 'mean over developed Nusselt number' }, [
    way({ needs: [], when: { energySolved: 'no' }, value: () => 1, formula: 'F = 1', source: 'one temperature throughout' }),
    way({ needs: ['entranceFactorNusseltLaminar'], when: { flowClass: 'internal', regime: 'laminar' }, value: ({ entranceFactorNusseltLaminar }) => entranceFactorNusseltLaminar, formula: 'F = F_lam', source: 'law of the regime' }),
    way({
      needs: ['entranceFactorNusseltLaminar', 'turbulentEntranceExcess', 'nusseltLaminar', 'nusseltPlain', 'regimeGroup', 'regimeLow', 'regimeHigh'], when: { flowClass: 'internal', regime: 'transitional' },
      value: (of) => 1 + of.turbulentEntranceExcess + ((of.entranceFactorNusseltLaminar - 1 - of.turbulentEntranceExcess) * stillLaminar(of) * of.nusseltLaminar) / of.nusseltPlain,
      formula: 'F Nu_0 = (1 - g) F_lam Nu_lam + (Nu_0 - (1 - g) Nu_lam)(1 + (D_h/L)^(2/3)), g = (x_r - x_lo)/(x_hi - x_lo)', source: 'Gnielinski, Int. J. Heat Mass Transfer 63 (2013) 134: both ends with their entrance, straight in between',
    }),
    way({ needs: ['turbulentEntranceExcess'], when: { flowClass: 'internal', regime: ['transitional', 'turbulent'] }, value: ({ turbulentEntranceExcess }) => 1 + turbulentEntranceExcess, formula: 'F = 1 + (D_h/L)^(2/3)', source: gnielinskiEntrance }),
  ]),
  quantity('entranceFactorFriction', { symbol: 'F_e,f', name: 'pressure drop with entrance over developed', unit: '1' }, [
    way({ needs: [], when: { inletProfile: ['developed', 'none'] }, value: () => 1, formula: 'F = 1', source: 'the profile arrives developed' }),
    way({ needs: ['entryLoss', 'frictionPlain', 'flowLength', 'hydraulicDiameter'], when: { flowClass: 'internal' }, value: ({ entryLoss, frictionPlain, flowLength, hydraulicDiameter }) => 1 + (entryLoss * hydraulicDiameter) / (frictionPlain * flowLength), formula: 'F = 1 + K_inf D_h/(f_0 L)', source: 'definition of the entry loss; the loss of the edge itself is apart' }),
    none,
  ]),
];
