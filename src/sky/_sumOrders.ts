/** The sum of all orders of scattering. */

/** first + kernel first + kernel² first + ..., until an order adds less than 1e-5 anywhere. */
export function sumOrders(first: Float64Array, kernel: Float64Array): Float64Array {
  const size = first.length; // even
  const total = first.slice();
  let order = first;
  for (let n = 0; n < 300; n++) {
    const next = new Float64Array(size);
    let most = 0;
    for (let r = 0; r < size; r++) {
      let a = 0;
      let b = 0;
      const row = r * size;
      for (let c = 0; c < size; c += 2) {
        a += kernel[row + c]! * order[c]!;
        b += kernel[row + c + 1]! * order[c + 1]!;
      }
      next[r] = a + b;
      total[r]! += a + b;
      most = Math.max(most, Math.abs(a + b) / Math.max(Math.abs(total[r]!), 1e-3));
    }
    order = next;
    if (most < 1e-5) break;
  }
  return total;
}
