/**
 * Arrays for the solver, which needs hundreds of small ones: cut from blocks, since an ArrayBuffer apiece takes engines
 * longer than the sums themselves. For what stays inside the library; a caller's arrays have buffers of their own.
 */

/** Makes an array of zeros. */
export type Zeros = (count: number) => Float64Array;

/** Numbers in the first block (8 kB), in the largest (64 kB), and the most that are cut from one. */
const FIRST = 1024;
const LARGEST = 8192;
const MOST = 1024;

/** A maker of arrays that keeps blocks of its own, each twice the last. */
export function zerosFromBlocks(): Zeros {
  let size = 0;
  let used = 0;
  let block = new ArrayBuffer(0);
  return (count) => {
    if (count > MOST) return new Float64Array(count);
    if (used + count > size) {
      size = Math.min(Math.max(2 * size, FIRST), LARGEST);
      block = new ArrayBuffer(size * Float64Array.BYTES_PER_ELEMENT);
      used = 0;
    }
    const start = used * Float64Array.BYTES_PER_ELEMENT;
    used += count;
    return new Float64Array(block, start, count);
  };
}

/** A copy to be overwritten. */
export function copyOf(zeros: Zeros, values: Float64Array): Float64Array {
  const copy = zeros(values.length);
  copy.set(values);
  return copy;
}
