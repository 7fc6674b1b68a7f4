import type { Held } from './held.ts';

/** Where works differ by more than both uncertainties, and which we follow. Material, property, reference, between which temperatures [K], and why. */
export const literatureDiffers: readonly (readonly [string, string, string, readonly [number, number], string])[] = [
  ['helium', 'specificHeatCapacity', 'Perry', [2, 3], 'the polynomial does not follow the rise towards the lambda point'],
  ['helium', 'viscosity', 'VDI', [3, 4], 'the polynomial of the gas has an offset that shows below 10 K'],
  ['helium', 'thermalConductivity', 'VDI', [3, 4], 'the polynomial of the gas has an offset that shows below 10 K'],
  ['hydrogen', 'thermalConductivity', 'Perry', [14, 15], 'the straight line of the handbook leaves the rise below 16 K'],
  ['hydrogen', 'vapourPressure', 'VDI', [14, 17], 'that correlation departs near the triple point; Perry is within 5 %'],
  ['hydrogen', 'viscosity', 'VDI', [21, 22], 'the polynomial of the gas has an offset that shows below 30 K'],
  ['propylene', 'viscosity', 'Perry', [309, 310], 'both handbooks fall faster above 300 K than the method of corresponding states'],
  ['n-hexane', 'vapourPressure', 'Perry', [228, 229], 'below 1 kPa; VDI is within 5 %'],
  ['n-hexane', 'viscosity', 'VDI', [402, 432], 'the correlation flattens above 420 K; Perry is within 15 %'],
  ['n-hexane', 'thermalConductivity', 'VDI', [431, 432], 'the polynomial falls off above 420 K; Perry is within 13 %'],
  ['n-dodecane', 'viscosity', 'VDI', [559, 560], 'the correlation flattens above 540 K; Perry is within 15 %'],
  ['m-xylene', 'viscosity', 'VDI', [524, 525], 'the correlation flattens above 510 K; Perry is within 15 %'],
  ['p-xylene', 'viscosity', 'VDI', [523, 524], 'the correlation flattens above 510 K; Perry is within 15 %'],
  ['methanol', 'vapourPressure', 'Perry', [230, 260], 'below 1 kPa; VDI is within 5 %'],
  ['ammonia', 'thermalConductivity', 'VDI', [195, 239], 'lower than Perry as well towards the triple point'],
  ['hydrogen sulphide', 'viscosity', 'VDI', [206, 760], 'higher than Perry as well'],
  ['hydrogen sulphide', 'surfaceTension', 'VDI', [188, 318], 'the critical compilation of Mulero and others lies 14 % to 26 % higher along the whole line'],
  ['sulphur hexafluoride', 'viscosity', 'Perry', [224, 271], 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'viscosity', 'VDI', [224, 271], 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'thermalConductivity', 'Perry', [224, 271], 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['sulphur hexafluoride', 'thermalConductivity', 'VDI', [224, 271], 'both handbooks give the liquid the same higher value; the reference correlation is the later work and fitted to measurements by its authors'],
  ['R-32', 'thermalConductivity', 'Perry', [346, 435], 'the handbooks bend down above 380 K, while the heat capacity of the gas rises'],
  ['R-32', 'thermalConductivity', 'VDI', [346, 435], 'the handbooks bend down above 380 K, while the heat capacity of the gas rises'],
  ['R-32', 'viscosity', 'VDI', [178, 199], 'the liquid is 20 % to 30 % above Perry and ours'],
  ['R-22', 'viscosity', 'CoolProp 8.0.0', [224, 448], 'for the liquid and the dense fluid above it the residual-entropy model there lies lower than three works: 0.296 mPa s at 230 K, VDI 0.302, Bergman et al. 0.355 (from memory), ours 0.355; at 293 K 0.135, VDI 0.164, ours 0.181'],
  ['R-22', 'viscosity', 'VDI', [187, 209], 'towards the triple point that polynomial rises less than CoolProp, too, 0.467 against 0.572 mPa s at 190 K, ours 0.614'],
  ['R-143a', 'viscosity', 'VDI', [180, 238], 'below 200 K'],
  ['R-143a', 'thermalConductivity', 'VDI', [346, 650], 'the polynomial of the gas bends down above 450 K, while the heat capacity rises'],
  ['1-butene', 'vapourPressure', 'Perry', [188, 237], 'below 10 kPa; VDI is within 3.6 %'],
  ['cyclopentane', 'density', 'Perry', [376, 435], 'above 400 K both handbooks lie higher than the later equation of state'],
  ['cyclopentane', 'density', 'VDI', [405, 435], 'above 400 K both handbooks lie higher than the later equation of state'],
  ['diethyl ether', 'specificHeatCapacity', 'Perry', [342, 397], 'the polynomial rises faster above 340 K; at room temperature both agree within 1.5 %'],
  ['dimethyl ether', 'viscosity', 'VDI', [248, 318], 'that correlation fails above 290 K; Perry is within 15 %'],
  ['molten tin', 'viscosity', 'smithells', [530, 1301], 'the Arrhenius law falls less than the later reference correlation; Viswanath and Natarajan are within 5 %'],
  ['bismuth', 'specificHeatCapacity', 'bergman-a7', [810, 1034], 'the table rises with temperature; the handbook and Kubaschewski and Alcock fall, within 4 % of each other'],
  ['bismuth', 'viscosity', 'bergman-a7', [1030, 1034], 'the table falls faster than the law of the handbook, which Smithells prints too'],
  ['glycerol-water', 'viscosity', 'melinder', [273, 287], 'near the freezing point and 60 % the fit lies lower than Segur and Oberstar, who print 29.9 mPa s at 60 % and 0 degC, as ours'],
];


/**
 * Why a value may differ from its reference by more than both uncertainties.
 *
 * @param one  the value
 * @returns    the reason, undefined where none is known
 */
export function differs(one: Held): string | undefined {
  return literatureDiffers.find(([material, property, reference, [low, high]]) => material === one.material && property === one.property && reference === one.reference && one.T >= low && one.T <= high)?.[4];
}
