/**
 * The standard normal distribution to full double precision in both tails. Our own rather than jStat's: its
 * cdf loses the lower tail (2 % off at z = −8) and its quantile stops at z = ±141 for p = 0 and 1 and is
 * wrong within 1e-6 of them; a chance of "one in a million" is read off exactly there.
 */

const SQRT_2_PI = Math.sqrt(2 * Math.PI);
const SQRT_32 = Math.sqrt(32);

/** Density of the standard normal distribution at z. */
export function normalDensity(z: number): number {
  return Math.exp(-0.5 * z * z) / SQRT_2_PI;
}

/**
 * Φ(z), the chance that a standard normal variable is at most z; relative error below 1e-14, down to the
 * smallest numbers of the lower tail.
 *
 * Source: Cody, "Rational Chebyshev Approximations for the Error Function", Mathematics of Computation 23
 * (1969), with the coefficients of ANORM in Algorithm 715, ACM TOMS 19 (1993).
 */
export function normalCdf(z: number): number {
  const x = Math.abs(z);
  if (x <= 0.67448975) {
    const square = z * z;
    return 0.5 + z * ratio(MIDDLE_ABOVE, MIDDLE_BELOW, square);
  }
  const tail = x < SQRT_32 ? densityTimes(x, ratio(SHOULDER_ABOVE, SHOULDER_BELOW, x)) : farTail(x);
  return z > 0 ? 1 - tail : tail;
}

function farTail(x: number): number {
  // Beyond this the area is smaller than the smallest number.
  if (x > 39) return 0;
  const inverse = 1 / (x * x);
  const correction = inverse * ratio(TAIL_ABOVE, TAIL_BELOW, inverse);
  return densityTimes(x, (1 / SQRT_2_PI - correction) / x);
}

/** exp(−x²/2) · factor, the square taken in two parts so that no digit of the exponent is lost. */
function densityTimes(x: number, factor: number): number {
  const coarse = Math.trunc(x * 16) / 16;
  const rest = (x - coarse) * (x + coarse);
  return Math.exp(-0.5 * coarse * coarse) * Math.exp(-0.5 * rest) * factor;
}

/**
 * The z with Φ(z) = p, relative error about 1e-16; −∞ at 0, ∞ at 1, NaN outside.
 *
 * Source: Wichura, "Algorithm AS 241: The Percentage Points of the Normal Distribution", Applied Statistics 37
 * (1988), PPND16.
 */
export function normalQuantile(p: number): number {
  if (!(p >= 0 && p <= 1)) return Number.NaN;
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * ratio(CENTRE_ABOVE, CENTRE_BELOW, 0.180625 - q * q);
  const tail = q < 0 ? p : 1 - p;
  if (tail === 0) return q < 0 ? -Infinity : Infinity;
  const r = Math.sqrt(-Math.log(tail));
  const z = r <= 5 ? ratio(OUTER_ABOVE, OUTER_BELOW, r - 1.6) : ratio(FAR_ABOVE, FAR_BELOW, r - 5);
  return q < 0 ? -z : z;
}

/** Quotient of two polynomials, coefficients from the highest power down. */
function ratio(above: readonly number[], below: readonly number[], x: number): number {
  return polynomial(above, x) / polynomial(below, x);
}

function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (const coefficient of coefficients) sum = sum * x + coefficient;
  return sum;
}

// prettier-ignore
const MIDDLE_ABOVE = [
  0.065682337918207449113, 2.2352520354606839287, 161.02823106855587881, 1067.6894854603709582,
  18154.981253343561249,
];
// prettier-ignore
const MIDDLE_BELOW = [
  1, 47.20258190468824187, 976.09855173777669322, 10260.932208618978205, 45507.789335026729956,
];
// prettier-ignore
const SHOULDER_ABOVE = [
  1.0765576773720192317e-8, 0.39894151208813466764, 8.8831497943883759412, 93.506656132177855979,
  597.27027639480026226, 2494.5375852903726711, 6848.1904505362823326, 11602.651437647350124,
  9842.7148383839780218,
];
// prettier-ignore
const SHOULDER_BELOW = [
  1, 22.266688044328115691, 235.38790178262499861, 1519.377599407554805, 6485.558298266760755,
  18615.571640885098091, 34900.952721145977266, 38912.003286093271411, 19685.429676859990727,
];
// prettier-ignore
const TAIL_ABOVE = [
  0.02307344176494017303, 0.21589853405795699, 0.1274011611602473639, 0.022235277870649807,
  0.001421619193227893466, 2.9112874951168792e-5,
];
// prettier-ignore
const TAIL_BELOW = [
  1, 1.28426009614491121, 0.468238212480865118, 0.0659881378689285515, 0.00378239633202758244,
  7.29751555083966205e-5,
];
// prettier-ignore
const CENTRE_ABOVE = [
  2509.0809287301226727, 33430.575583588128105, 67265.770927008700853, 45921.953931549871457,
  13731.693765509461125, 1971.5909503065514427, 133.14166789178437745, 3.387132872796366608,
];
// prettier-ignore
const CENTRE_BELOW = [
  5226.495278852854561, 28729.085735721942674, 39307.89580009271061, 21213.794301586595867,
  5394.1960214247511077, 687.1870074920579083, 42.313330701600911252, 1,
];
// prettier-ignore
const OUTER_ABOVE = [
  7.7454501427834140764e-4, 0.0227238449892691845833, 0.24178072517745061177, 1.27045825245236838258,
  3.64784832476320460504, 5.7694972214606914055, 4.6303378461565452959, 1.42343711074968357734,
];
// prettier-ignore
const OUTER_BELOW = [
  1.05075007164441684324e-9, 5.475938084995344946e-4, 0.0151986665636164571966, 0.14810397642748007459,
  0.68976733498510000455, 1.6763848301838038494, 2.05319162663775882187, 1,
];
// prettier-ignore
const FAR_ABOVE = [
  2.01033439929228813265e-7, 2.71155556874348757815e-5, 0.0012426609473880784386, 0.026532189526576123093,
  0.29656057182850489123, 1.7848265399172913358, 5.4637849111641143699, 6.6579046435011037772,
];
// prettier-ignore
const FAR_BELOW = [
  2.04426310338993978564e-15, 1.4215117583164458887e-7, 1.8463183175100546818e-5, 7.868691311456132591e-4,
  0.0148753612908506148525, 0.13692988092273580531, 0.59983220655588793769, 1,
];
