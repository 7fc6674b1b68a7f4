export { at } from './at.ts';
export { brent } from './brent.ts';
export { march } from './ode.ts';
export { pchip } from './pchip.ts';
export { integrate } from './quadrature.ts';
export { dispersedConversion, segregatedConversion } from './reactor.ts';
export { besselJ, erf, erfc, erfcScaled } from './special.ts';
