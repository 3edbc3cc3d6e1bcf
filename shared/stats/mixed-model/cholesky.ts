/** Symmetric positive definite matrices, size × size, flat by rows. Small (units plus positions), so no pivoting. */

export interface Inverse {
  /** A⁻¹, flat by rows. */
  readonly inverse: Float64Array
  /** log |A|. */
  readonly logDeterminant: number
}

/**
 * Inverse and log-determinant by Cholesky's factor; null where a pivot falls to `smallest` of its own diagonal or less
 * (an effect that the data cannot tell from others).
 *
 * Cost: size³.
 */
export function invertPositive(matrix: Float64Array, size: number, smallest = 1e-11): Inverse | null {
  const factor = cholesky(matrix, size, smallest)
  if (!factor) return null
  let logDeterminant = 0
  for (let i = 0; i < size; i++) logDeterminant += 2 * Math.log(factor[i * size + i]!)
  const lower = invertLower(factor, size)
  const inverse = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let total = 0
      for (let k = i; k < size; k++) total += lower[k * size + i]! * lower[k * size + j]!
      inverse[i * size + j] = total
      inverse[j * size + i] = total
    }
  }
  return { inverse, logDeterminant }
}

/** Lower factor L with A = LL', or null. */
function cholesky(matrix: Float64Array, size: number, smallest: number): Float64Array | null {
  const factor = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let total = matrix[i * size + j]!
      for (let k = 0; k < j; k++) total -= factor[i * size + k]! * factor[j * size + k]!
      if (i === j) {
        if (!(total > smallest * matrix[i * size + i]!)) return null
        factor[i * size + i] = Math.sqrt(total)
      } else {
        factor[i * size + j] = total / factor[j * size + j]!
      }
    }
  }
  return factor
}

function invertLower(factor: Float64Array, size: number): Float64Array {
  const out = new Float64Array(size * size)
  for (let j = 0; j < size; j++) {
    out[j * size + j] = 1 / factor[j * size + j]!
    for (let i = j + 1; i < size; i++) {
      let total = 0
      for (let k = j; k < i; k++) total -= factor[i * size + k]! * out[k * size + j]!
      out[i * size + j] = total / factor[i * size + i]!
    }
  }
  return out
}

/** A b for a flat size × size matrix. */
export function times(matrix: Float64Array, vector: Float64Array, size: number): Float64Array {
  const out = new Float64Array(size)
  for (let i = 0; i < size; i++) {
    let total = 0
    for (let j = 0; j < size; j++) total += matrix[i * size + j]! * vector[j]!
    out[i] = total
  }
  return out
}

/** A B for flat size × size matrices. */
export function multiply(a: Float64Array, b: Float64Array, size: number): Float64Array {
  const out = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let k = 0; k < size; k++) {
      const left = a[i * size + k]!
      if (left === 0) continue
      for (let j = 0; j < size; j++) out[i * size + j]! += left * b[k * size + j]!
    }
  }
  return out
}

/** tr(AB) for flat size × size matrices. */
export function traceOfProduct(a: Float64Array, b: Float64Array, size: number): number {
  let total = 0
  for (let i = 0; i < size; i++) for (let j = 0; j < size; j++) total += a[i * size + j]! * b[j * size + i]!
  return total
}

export function dot(a: Float64Array, b: Float64Array): number {
  let total = 0
  for (let i = 0; i < a.length; i++) total += a[i]! * b[i]!
  return total
}
