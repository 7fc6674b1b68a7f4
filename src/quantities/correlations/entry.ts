// Entrances: how long flow and temperature take to develop, and what the entrance adds. Graetz number Gz = Re Pr D_h/L.

/**
 * Mean Nusselt number of laminar pipe flow over the heated length, wall temperature uniform, velocity and temperature developing.
 *
 * @param graetz   over the heated length
 * @param prandtl  at the bulk temperature; very large for a developed velocity profile
 * @returns        mean Nusselt number
 * @example        laminarMeanNusselt({ graetz: 100, prandtl: 1e12 }) // 7.1798
 * @range          graetz up to 1e4; within 1.3 % of the exact value for a developed profile
 * @scatter        5 %
 * @source         Baehr and Stephan, Heat and Mass Transfer (2006), eq. 3.252
 */
export function laminarMeanNusselt({ graetz, prandtl }: { graetz: number; prandtl: number }): number {
  const g = graetz ** (-1 / 3);
  return (3.657 / Math.tanh(2.264 * g + 1.7 * g * g) + 0.0499 * graetz * Math.tanh(1 / graetz)) / Math.tanh(2.432 * prandtl ** (1 / 6) / graetz ** (1 / 6));
}

/**
 * Mean Nusselt number of laminar pipe flow, Nu = 3.66 + c Gz/(1 + 0.04 Gz^(2/3)).
 *
 * @param graetz    over the heated length
 * @param constant  0.0668 as first published, 0.065 in later handbooks
 * @returns         mean Nusselt number
 * @example         hausen({ graetz: 40, constant: 0.0668 }) // 5.48036
 * @range           velocity developed; 12 % high at graetz 1e4
 * @scatter         12 %
 * @source          Hausen, Z. VDI Beih. Verfahrenstechnik 4 (1943) 91; 0.065: Edwards, Denny and Mills, Transfer Processes (1979)
 */
export function hausen({ graetz, constant }: { graetz: number; constant: number }): number {
  return 3.66 + (constant * graetz) / (1 + 0.04 * graetz ** (2 / 3));
}

/**
 * Mean Nusselt number in a laminar thermal entrance, Nu = 1.86 Gz^(1/3) (mu/mu_w)^0.14.
 *
 * @param graetz          over the heated length
 * @param viscosityRatio  bulk over wall viscosity
 * @returns               mean Nusselt number
 * @example               siederTateLaminar({ graetz: 3200, viscosityRatio: 1.8 }) // 29.7601
 * @range                 graetz above 10; 15 to 21 % above the exact value at graetz 30 to 1e4
 * @scatter               20 %
 * @source                Sieder and Tate, Ind. Eng. Chem. 28 (1936) 1429
 */
export function siederTateLaminar({ graetz, viscosityRatio }: { graetz: number; viscosityRatio: number }): number {
  return 1.86 * graetz ** (1 / 3) * viscosityRatio ** 0.14;
}

/**
 * Local Nusselt number of laminar pipe flow at uniform wall flux, velocity developed.
 *
 * @param position  distance from the start of heating over D Re Pr
 * @returns         local Nusselt number
 * @example         laminarLocalNusseltFlux({ position: 0.01 }) // 6.16063
 * @range           within 1.2 %
 * @source          Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 189
 */
export function laminarLocalNusseltFlux({ position }: { position: number }): number {
  if (position > 1.5e-3) return 4.364 + 8.68 * (1e3 * position) ** -0.506 * Math.exp(-41 * position);
  return 1.302 * position ** (-1 / 3) - (position > 5e-5 ? 0.5 : 1);
}

/**
 * Thin-layer limit of transfer in developed pipe flow: local 1.077 Gz^(1/3), mean over the length 1.615 Gz^(1/3).
 *
 * @param graetz  on the distance from the start of transfer
 * @returns       local and mean Nusselt or Sherwood number
 * @example       levequePipe({ graetz: 5000 }).mean // 27.6161
 * @range         graetz above about 100
 * @source        Leveque, Ann. Mines 13 (1928) 201
 */
export function levequePipe({ graetz }: { graetz: number }): { local: number; mean: number } {
  return { local: 1.077 * graetz ** (1 / 3), mean: 1.615 * graetz ** (1 / 3) };
}

/**
 * What a turbulent entrance adds to the mean transfer, 1 + (D/L)^(2/3).
 *
 * @param diameterOverLength  hydraulic diameter over heated length
 * @returns                   mean over developed value
 * @example                   turbulentEntrance({ diameterOverLength: 0.027 }) // 1.09
 * @range                     prandtl above 0.7
 * @source                    Hausen 1959, as in Gnielinski, Int. Chem. Eng. 16 (1976) 359
 */
export function turbulentEntrance({ diameterOverLength }: { diameterOverLength: number }): number {
  return 1 + diameterOverLength ** (2 / 3);
}

/**
 * Laminar entrance length of a pipe or a channel over its diameter or gap, (a^1.6 + (b Re)^1.6)^(1/1.6).
 *
 * @param reynolds  on the diameter (pipe) or on the gap (channel)
 * @param passage   pipe or channel
 * @returns         length to 99 % of the final speed in the middle, over diameter or gap
 * @example         laminarEntranceLength({ reynolds: 100, passage: 'pipe' }) // 5.77188
 * @range           laminar flow, uniform inlet
 * @scatter         5 %
 * @source          Durst, Ray, Unsal and Bayoumi, J. Fluids Eng. 127 (2005) 1154
 */
export function laminarEntranceLength({ reynolds, passage }: { reynolds: number; passage: 'pipe' | 'channel' }): number {
  const [a, b] = passage === 'pipe' ? [0.619, 0.0567] : [0.631, 0.0442];
  return (a ** 1.6 + (b * reynolds) ** 1.6) ** (1 / 1.6);
}

/**
 * Turbulent entrance length over the hydraulic diameter, 1.359 Re^(1/4) or 4.4 Re^(1/6).
 *
 * @param reynolds  on the hydraulic diameter
 * @returns         the two published laws; moments of the fluctuations need 50 to 80
 * @example         turbulentEntranceLength({ reynolds: 24915 }).first // 17.07
 * @source          Bhatti and Shah, in Handbook of Single-Phase Convective Heat Transfer (1987); second: White, Fluid Mechanics
 */
export function turbulentEntranceLength({ reynolds }: { reynolds: number }): { first: number; second: number } {
  return { first: 1.359 * reynolds ** 0.25, second: 4.4 * reynolds ** (1 / 6) };
}

/**
 * Apparent friction of the laminar entrance of a pipe, profile change and friction together.
 *
 * @param position  distance from the inlet over D Re
 * @returns         apparent Fanning factor times Reynolds number
 * @example         apparentFrictionReynolds({ position: 0.01 }) // 38.5452
 * @range           any position; 16 far downstream
 * @scatter         2 %
 * @source          Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 192
 */
export function apparentFrictionReynolds({ position }: { position: number }): number {
  const start = 3.44 / Math.sqrt(position);
  return start + (1.25 / (4 * position) + 16 - start) / (1 + 0.00021 * position ** -2);
}

/**
 * Entrance excess of the pressure drop of laminar pipe flow, K = 1.20 + 38/Re.
 *
 * @param reynolds  on the diameter
 * @returns         loss number far downstream
 * @example         pipeEntryLoss({ reynolds: 1000 }) // 1.238
 * @range           reynolds above about 20
 * @scatter         10 %
 * @source          Chen, J. Fluids Eng. 95 (1973) 153
 */
export function pipeEntryLoss({ reynolds }: { reynolds: number }): number {
  return 1.2 + 38 / reynolds;
}
