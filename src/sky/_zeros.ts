/**
 * Arrays for the solver, which needs hundreds of small ones: cut from blocks, since an ArrayBuffer apiece takes engines
 * longer than the sums themselves. For what stays inside the library; a caller's arrays have buffers of their own.
 */

/** Numbers in a block (64 kB), and the most that are cut from one. */
const BLOCK = 8192;
const MOST = 1024;

let block: ArrayBuffer | undefined;
let used = 0;

/** An array of zeros. */
export function zeros(count: number): Float64Array {
  if (count > MOST) return new Float64Array(count);
  if (block === undefined || used + count > BLOCK) {
    block = new ArrayBuffer(BLOCK * Float64Array.BYTES_PER_ELEMENT);
    used = 0;
  }
  const start = used * Float64Array.BYTES_PER_ELEMENT;
  used += count;
  return new Float64Array(block, start, count);
}

/** A copy to be overwritten. */
export function copyOf(values: Float64Array): Float64Array {
  const copy = zeros(values.length);
  copy.set(values);
  return copy;
}
