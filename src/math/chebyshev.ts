/**
 * Chebyshev interpolation on [−1, 1] at the roots of T_n.
 * Source: Press et al., Numerical Recipes, 3rd ed. (2007), §5.8 (coefficients) and §5.9 (derivatives).
 */

/** What every fit of one order shares. */
interface Order {
  readonly nodes: Float64Array;
  /** cos(π j (k + ½) / n), row j, column k. */
  readonly cosines: Float64Array;
}

const orders = new Map<number, Order>();

function orderOf(n: number): Order {
  let order = orders.get(n);
  if (order === undefined) {
    order = {
      nodes: Float64Array.from({ length: n }, (_, k) => Math.cos((Math.PI * (k + 0.5)) / n)),
      cosines: Float64Array.from({ length: n * n }, (_, i) =>
        Math.cos((Math.PI * Math.floor(i / n) * ((i % n) + 0.5)) / n),
      ),
    };
    orders.set(n, order);
  }
  return order;
}

/** The n interpolation nodes in [−1, 1], in falling order. Shared: not to be written to. */
export const chebyshevNodes = (n: number): Float64Array => orderOf(n).nodes;

/**
 * Writes into `coefficients[offset … offset+n−1]` the polynomial that takes the given values at the n nodes.
 * The constant term is stored already halved, so that f(x) = Σ c_j T_j(x).
 */
export function fitChebyshev(values: Float64Array, coefficients: Float64Array, offset: number): void {
  const n = values.length;
  const { cosines } = orderOf(n);
  for (let j = 0; j < n; j++) {
    let sum = 0;
    for (let k = 0; k < n; k++) sum += values[k]! * cosines[j * n + k]!;
    coefficients[offset + j] = (j === 0 ? 1 : 2) * (sum / n);
  }
}

/** A value with its first and second derivative with respect to x. */
export interface Jet {
  value: number;
  rate: number;
  acceleration: number;
}

/**
 * Evaluates Σ c_j T_j(x) with its first two derivatives by Clenshaw's recurrence, into `jet`.
 * @param x in [−1, 1]; outside, the polynomial extrapolates and soon means nothing.
 */
export function evaluateChebyshev(
  coefficients: Float64Array,
  offset: number,
  n: number,
  x: number,
  jet: Jet,
): void {
  const twoX = 2 * x;
  let b1 = 0;
  let b2 = 0;
  let d1 = 0;
  let d2 = 0;
  let e1 = 0;
  let e2 = 0;
  for (let j = n - 1; j >= 1; j--) {
    const b = twoX * b1 - b2 + coefficients[offset + j]!;
    const d = twoX * d1 - d2 + 2 * b1;
    const e = twoX * e1 - e2 + 4 * d1;
    b2 = b1;
    b1 = b;
    d2 = d1;
    d1 = d;
    e2 = e1;
    e1 = e;
  }
  jet.value = x * b1 - b2 + coefficients[offset]!;
  jet.rate = x * d1 - d2 + b1;
  jet.acceleration = x * e1 - e2 + 2 * d1;
}

/** Evaluates Σ c_j T_j(x) alone: a third of the work of the full jet. */
export function chebyshevValue(coefficients: Float64Array, offset: number, n: number, x: number): number {
  const twoX = 2 * x;
  let b1 = 0;
  let b2 = 0;
  for (let j = n - 1; j >= 1; j--) {
    const b = twoX * b1 - b2 + coefficients[offset + j]!;
    b2 = b1;
    b1 = b;
  }
  return x * b1 - b2 + coefficients[offset]!;
}
