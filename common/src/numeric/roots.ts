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
  const roots = Array.from({ length: degree }, (_, k) => polar(1, (2 * Math.PI * k) / degree + 0.4));
  for (let iteration = 0; iteration < ITERATIONS; iteration++) {
    let largest = 0;
    for (let k = 0; k < degree; k++) {
      const step = divide(evaluate(monic, roots[k]), separation(roots, k));
      roots[k] = { re: roots[k].re - step.re, im: roots[k].im - step.im };
      largest = Math.max(largest, Math.hypot(step.re, step.im) / Math.hypot(roots[k].re, roots[k].im));
    }
    if (largest < TOLERANCE) break;
  }
  return roots.map(({ re, im }) => ({ re: re * scale, im: im * scale }));
}

function separation(roots: readonly Complex[], k: number): Complex {
  let product: Complex = { re: 1, im: 0 };
  for (let j = 0; j < roots.length; j++) {
    if (j !== k)
      product = multiply(product, { re: roots[k].re - roots[j].re, im: roots[k].im - roots[j].im });
  }
  return product;
}

function evaluate(coefficients: readonly number[], x: Complex): Complex {
  let value: Complex = { re: 0, im: 0 };
  for (let k = coefficients.length - 1; k >= 0; k--) {
    value = multiply(value, x);
    value = { re: value.re + coefficients[k], im: value.im };
  }
  return value;
}

function polar(radius: number, angle: number): Complex {
  return { re: radius * Math.cos(angle), im: radius * Math.sin(angle) };
}

function multiply(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

function divide(a: Complex, b: Complex): Complex {
  const norm = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / norm, im: (a.im * b.re - a.re * b.im) / norm };
}
