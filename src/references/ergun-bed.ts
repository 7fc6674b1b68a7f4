import { reference } from './define.ts';
import { density, length, speed, viscosity } from './inputs.ts';

export const ergunBed = reference('ergun-bed', {
  title: 'Pressure drop of a packed bed of spheres',
  kind: 'measured',
  assumes: ['random bed of spheres', 'bed wide against the particle', 'constant density', 'speed counted over the empty section'],
  verifies: ['drag law of a porous region', 'resolved flow between particles'],
  source: 'Ergun, Chem. Eng. Prog. 48 (1952) 89-94; KTA rule 3102.3 (1981) as second law',
  uncertainty: 0.2,
  passLimit: 0.2,
  ifMissed: 'void fraction, which enters cubed; superficial speed, not the one between the particles; bed narrower than twenty particles',
  flows: ['packed-bed'],
  needs: [
    { ...speed, name: 'superficial speed' }, { ...length, name: 'particle diameter' }, { id: 'voidFraction', unit: '1', name: 'void fraction', range: [0.3, 0.7] }, density, viscosity,
    { id: 'flowLength', unit: 'm', name: 'length of the bed' },
  ],
  values: [
    { id: 'viscousGradient', name: 'viscous part of the pressure fall per length', unit: 'Pa/m', formula: '150 mu U (1 - e)^2/(d^2 e^3)', value: viscous },
    { id: 'inertialGradient', name: 'inertial part of the pressure fall per length', unit: 'Pa/m', formula: '1.75 rho U^2 (1 - e)/(d e^3)', value: inertial },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = 150 mu U (1 - e)^2/(d^2 e^3) + 1.75 rho U^2 (1 - e)/(d e^3)', value: (g) => viscous(g) + inertial(g) },
    { id: 'pressureDrop', name: 'pressure drop of the bed', unit: 'Pa', formula: 'dp = -dp/dx L', value: (g) => (viscous(g) + inertial(g)) * g.flowLength },
    {
      id: 'pressureGradientSecond',
      name: 'pressure fall per length, second law',
      unit: 'Pa/m',
      formula: '-dp/dx = (320/X + 6/X^0.1)(1 - e) rho U^2/(2 e^3 d), X = Re/(1 - e)',
      value: (g) => {
        const x = (g.density * Math.abs(g.speed) * g.length) / (g.viscosity * (1 - g.voidFraction));
        return x === 0 ? 0 : ((320 / x + 6 / x ** 0.1) * (1 - g.voidFraction) * g.density * g.speed * Math.abs(g.speed)) / (2 * g.voidFraction ** 3 * g.length);
      },
      uncertainty: 0.15,
    },
  ],
});

interface Bed { readonly speed: number; readonly length: number; readonly voidFraction: number; readonly density: number; readonly viscosity: number }

function viscous({ speed, length, voidFraction: e, viscosity }: Bed): number {
  return (150 * viscosity * speed * (1 - e) ** 2) / (length ** 2 * e ** 3);
}

function inertial({ speed, length, voidFraction: e, density }: Bed): number {
  return (1.75 * density * speed * Math.abs(speed) * (1 - e)) / (length * e ** 3);
}
