/**
 * Friction of developed laminar flow in a rectangular duct.
 *
 * @param aspect  short side over long side, 0 .. 1
 * @returns       Darcy friction factor times Reynolds number on the hydraulic diameter
 * @source        Fourier series of the momentum balance; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VII
 */
export function ductFriction(aspect: number): number {
  if (aspect === 0) return 96;
  let sum = 0;
  for (let n = 1; n <= 99; n += 2) sum += Math.tanh((n * Math.PI) / (2 * aspect)) / n ** 5;
  return 96 / ((1 + aspect) ** 2 * (1 - ((192 * aspect) / Math.PI ** 5) * sum));
}

/**
 * Speed over the mean in a rectangular duct.
 *
 * @param aspect  short side over long side, above 0 up to 1
 * @param y       place across the short side, from the middle, over half of it, -1 .. 1
 * @param z       place across the long side, from the middle, over half of it, -1 .. 1
 * @returns       u/U
 * @source        as ductFriction; the mean is the sum that friction uses
 */
export function ductSpeed(aspect: number, y: number, z: number): number {
  let local = 0;
  for (let n = 1; n <= 401; n += 2) {
    const decay = coshRatio((n * Math.PI) / (2 * aspect), z);
    local += ((n % 4 === 1 ? 1 : -1) * (1 - decay) * Math.cos((n * Math.PI * y) / 2)) / n ** 3;
  }
  // In units of H^2/(4 mu) dp/dx: 32/pi^3 times the sum, and a mean that friction knows.
  return ((32 / Math.PI ** 3) * local) / (64 / ((1 + aspect) ** 2 * ductFriction(aspect)));
}

function coshRatio(a: number, z: number): number {
  const x = Math.abs(z);
  return (Math.exp(-a * (1 - x)) * (1 + Math.exp(-2 * a * x))) / (1 + Math.exp(-2 * a));
}

/**
 * Developed Nusselt number of a rectangular duct, flux uniform along the duct and temperature uniform around it (H1).
 *
 * @param aspect  short side over long side, 0 .. 1
 * @returns       Nusselt number on the hydraulic diameter
 * @source        double sine series of speed and temperature; the sum over one direction is closed with the tanh of its partial fractions
 */
export function ductNusseltFlux(aspect: number): number {
  if (aspect === 0) return 140 / 17;
  let speedSum = 0, temperatureSum = 0;
  for (let n = 1; n <= 801; n += 2) {
    // Sums over odd m of 1/(m^2 (m^2 + a)^j), j = 1 and 3, with a = (n/aspect)^2.
    const root = n / aspect, a = root * root, x = (Math.PI * root) / 2;
    const t = Math.tanh(x), s = x > 300 ? 0 : 1 / Math.cosh(x) ** 2;
    const t1 = (Math.PI * t) / (4 * root);
    const t2 = t1 / (2 * a) - (Math.PI ** 2 * s) / (16 * a);
    const t3 = (3 * t1) / (8 * a * a) - (3 * Math.PI ** 2 * s) / (64 * a * a) - (Math.PI ** 3 * s * t) / (64 * a * root);
    const base = Math.PI ** 2 / 8 - t1;
    speedSum += base / (a * n * n);
    temperatureSum += (base / a ** 3 - t2 / a ** 2 - t3 / a) / (n * n);
  }
  // lambda = pi^2 (m^2 + a)/W^2 with W the long side; the hydraulic diameter is 2 aspect/(1 + aspect) W.
  const diameter = (2 * aspect) / (1 + aspect);
  return ((16 * diameter ** 2) / Math.PI ** 2) * (speedSum ** 2 / temperatureSum);
}
