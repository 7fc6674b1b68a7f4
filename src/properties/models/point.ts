/** Thermodynamic properties of one state on one side of the saturation line, SI. */
export interface Point {
  /** [K] */
  temperature: number;
  /** [Pa] */
  pressure: number;
  /** [kg/m^3] */
  density: number;
  /** Isobaric specific heat capacity [J/(kg K)]. */
  specificHeatCapacity: number;
  /** Isochoric specific heat capacity [J/(kg K)]. */
  isochoricHeatCapacity: number;
  /** [m/s] */
  speedOfSound: number;
  /** -(1/rho) (d rho / d T) at constant pressure [1/K]. */
  thermalExpansion: number;
  /** (1/rho) (d rho / d p) at constant temperature [1/Pa]. */
  compressibility: number;
  /** [J/kg]; only differences mean something. */
  enthalpy: number;
  /** How far a mixture of gases is from an ideal gas: repulsion and attraction in its compressibility factor, added. */
  departure?: number;
}

/** The two sides of a saturation line that an equation of state can be asked for. */
export type Side = 'liquid' | 'vapour';

/** Saturation line of a pure fluid, or bubble and dew line of a mixture treated as one fluid. */
export interface SaturationLine {
  /** Lowest and highest temperature of the line [K]. */
  readonly from: number;
  readonly to: number;
  /** Pressure [Pa] at which the liquid boils at T [K]. */
  bubble(T: number): number;
  /** Pressure [Pa] at which the vapour condenses at T [K]. */
  dew(T: number): number;
  /** Boiling temperature [K] at p [Pa], where the source states it. */
  boiling?(p: number): number;
}

/** The saturation line of an equation of state that has one. */
export function lineOf(equation: EquationOfState): SaturationLine {
  if (equation.line === undefined) throw new Error('this equation of state has no saturation line');
  return equation.line;
}

/** Residual Helmholtz energy over R T, its derivatives by the reciprocal reduced temperature tau and the reduced density delta. */
export interface ReducedResidual {
  readonly tau: number;
  readonly delta: number;
  readonly a: number;
  readonly d: number;
  readonly dd: number;
  readonly t: number;
  readonly tt: number;
  readonly dt: number;
}

/** What every equation of state offers. */
export interface EquationOfState {
  /** Properties at T [K] and p [Pa]; `side` is used only below the critical temperature. The caller has checked the phase. */
  at(T: number, p: number, side: Side): Point;
  /** Properties at T [K] and density [kg/m^3]: for transport correlations and verification tables. */
  of(T: number, rho: number): Point;
  /** Reduced residual energy and its derivatives at T [K] and density [kg/m^3], where the equation is one of energy. */
  residual?(T: number, rho: number): ReducedResidual;
  readonly line?: SaturationLine;
  /** The share at another state of the same matter, where it is counted against saturation: relative humidity falls as moist air warms. */
  carried?(share: number, from: { readonly T: number; readonly p: number }, to: { readonly T: number; readonly p: number }): number;
  /** Specific gas constant [J/(kg K)]. */
  readonly gasConstant: number;
}
