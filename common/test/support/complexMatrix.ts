/** A square complex matrix, row by row. */
export interface ComplexMatrix {
  size: number;
  re: Float64Array;
  im: Float64Array;
}

/** Solves Aᵀy = e, e being the unit vector at `position`, by Gaussian elimination with partial pivoting. */
export function solveTransposed({ size, re, im }: ComplexMatrix, position: number) {
  const width = size + 1;
  const a = new Float64Array(size * width);
  const b = new Float64Array(size * width);
  for (let row = 0; row < size; row++) {
    for (let column = 0; column < size; column++) {
      a[row * width + column] = re[column * size + row];
      b[row * width + column] = im[column * size + row];
    }
  }
  a[position * width + size] = 1;
  for (let k = 0; k < size; k++) {
    swapRows(a, b, width, k, pivotRow(a, b, size, k));
    for (let row = k + 1; row < size; row++) eliminate(a, b, width, k, row);
  }
  return substituteBack(a, b, size);
}

function pivotRow(a: Float64Array, b: Float64Array, size: number, k: number): number {
  let best = k;
  const magnitude = (row: number) => Math.hypot(a[row * (size + 1) + k], b[row * (size + 1) + k]);
  for (let row = k + 1; row < size; row++) if (magnitude(row) > magnitude(best)) best = row;
  return best;
}

function swapRows(a: Float64Array, b: Float64Array, width: number, first: number, second: number): void {
  if (first === second) return;
  for (const part of [a, b]) {
    for (let j = 0; j < width; j++) {
      const kept = part[first * width + j];
      part[first * width + j] = part[second * width + j];
      part[second * width + j] = kept;
    }
  }
}

function eliminate(a: Float64Array, b: Float64Array, width: number, k: number, row: number): void {
  const p = k * width;
  const r = row * width;
  if (a[r + k] === 0 && b[r + k] === 0) return;
  const norm = a[p + k] ** 2 + b[p + k] ** 2;
  const x = (a[r + k] * a[p + k] + b[r + k] * b[p + k]) / norm;
  const y = (b[r + k] * a[p + k] - a[r + k] * b[p + k]) / norm;
  for (let j = k; j < width; j++) {
    a[r + j] -= x * a[p + j] - y * b[p + j];
    b[r + j] -= x * b[p + j] + y * a[p + j];
  }
}

function substituteBack(a: Float64Array, b: Float64Array, size: number) {
  const width = size + 1;
  const re = new Float64Array(size);
  const im = new Float64Array(size);
  for (let row = size - 1; row >= 0; row--) {
    const r = row * width;
    let x = a[r + size];
    let y = b[r + size];
    for (let j = row + 1; j < size; j++) {
      x -= a[r + j] * re[j] - b[r + j] * im[j];
      y -= a[r + j] * im[j] + b[r + j] * re[j];
    }
    const norm = a[r + row] ** 2 + b[r + row] ** 2;
    re[row] = (x * a[r + row] + y * b[r + row]) / norm;
    im[row] = (y * a[r + row] - x * b[r + row]) / norm;
  }
  return { re, im };
}
