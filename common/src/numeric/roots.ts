/** A complex number. */
export interface Complex {
  re: number;
  im: number;
}

/**
 * The roots of a real polynomial c₀ + c₁x + … + cₙxⁿ of low degree, all at once by the Durand–Kerner
 * iteration; quadratics and below in closed form. Leading zero coefficients lower the degree.
 *
 * @param coefficients ascending; finite
 * @returns the roots, as many as the degree, in no particular order; accurate to about 1e-12 relative
 *   for well-separated roots
 * Source: Durand 1960, Kerner 1966.
 */
export function polynomialRoots(coefficients: readonly number[]): Complex[] {
  let degree = coefficients.length - 1;
  while (degree > 0 && coefficients[degree] === 0) degree--;
  if (degree < 1) return [];
  if (degree === 1) return [{ re: -coefficients[0] / coefficients[1], im: 0 }];
  if (degree === 2) return quadraticRoots(coefficients[0], coefficients[1], coefficients[2]);
  return durandKerner(coefficients.slice(0, degree + 1));
}

function quadraticRoots(c: number, b: number, a: number): Complex[] {
  const discriminant = b * b - 4 * a * c;
  if (discriminant < 0) {
    const im = Math.sqrt(-discriminant) / (2 * a);
    return [
      { re: -b / (2 * a), im },
      { re: -b / (2 * a), im: -im },
    ];
  }
  const q = -(b + Math.sign(b || 1) * Math.sqrt(discriminant)) / 2;
  return [
    { re: q / a, im: 0 },
    { re: q === 0 ? 0 : c / q, im: 0 },
  ];
}

const ITERATIONS = 200;
const TOLERANCE = 1e-13;

function durandKerner(coefficients: readonly number[]): Complex[] {
  const degree = coefficients.length - 1;
  const scale = (Math.abs(coefficients[0] / coefficients[degree]) || 1) ** (1 / degree);
  const monic = coefficients.map((c, k) => (c / coefficients[degree]) * scale ** (k - degree));
  const re = Float64Array.from(monic.slice(1), (_, k) => Math.cos((2 * Math.PI * k) / degree + 0.4));
  const im = Float64Array.from(monic.slice(1), (_, k) => Math.sin((2 * Math.PI * k) / degree + 0.4));
  for (let iteration = 0; iteration < ITERATIONS; iteration++) {
    if (improve(monic, re, im) < TOLERANCE) break;
  }
  return Array.from(re, (x, k) => ({ re: x * scale, im: im[k] * scale }));
}

/** Moves each root by the polynomial over the product of its distances to the others; answers the largest relative step. */
function improve(monic: readonly number[], re: Float64Array, im: Float64Array): number {
  let largest = 0;
  for (let k = 0; k < re.length; k++) {
    const x = re[k];
    const y = im[k];
    let valueRe = 1;
    let valueIm = 0;
    for (let j = monic.length - 2; j >= 0; j--) {
      [valueRe, valueIm] = [valueRe * x - valueIm * y + monic[j], valueRe * y + valueIm * x];
    }
    let productRe = 1;
    let productIm = 0;
    for (let j = 0; j < re.length; j++) {
      if (j === k) continue;
      const dx = x - re[j];
      const dy = y - im[j];
      [productRe, productIm] = [productRe * dx - productIm * dy, productRe * dy + productIm * dx];
    }
    const norm = productRe * productRe + productIm * productIm;
    const stepRe = (valueRe * productRe + valueIm * productIm) / norm;
    const stepIm = (valueIm * productRe - valueRe * productIm) / norm;
    re[k] -= stepRe;
    im[k] -= stepIm;
    largest = Math.max(largest, Math.hypot(stepRe, stepIm) / Math.hypot(re[k], im[k]));
  }
  return largest;
}
