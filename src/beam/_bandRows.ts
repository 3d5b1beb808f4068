/** Depths of a saturating band at the nodes of air mass, and their sum into a list of depths. */
import { UNITS_PER_DEPTH } from "./_attenuate.js";
import { NODES, nodeMass, nodeWeights } from "./_massNodes.js";

/** Slant depths over the stretch of wavelengths where the band absorbs. */
export interface BandRows {
  /** Index of the first wavelength of the stretch. */
  readonly first: number;
  /** Length of the stretch. */
  readonly count: number;
  /** Depths in the kernel's unit: `count` for the first node, `count` for the second, and so on. */
  readonly rows: Float64Array;
}

/** Rows from each wavelength's band coefficient times the vertical amount. */
export function bandRows(amounts: Float64Array, depthOf: (x: number) => number): BandRows {
  let first = 0;
  let end = amounts.length;
  while (first < end && amounts[first] === 0) first++;
  while (end > first && amounts[end - 1] === 0) end--;
  const count = end - first;
  const rows = new Float64Array(count * NODES);
  for (let k = 0; k < NODES; k++) {
    const mass = nodeMass(k);
    for (let i = 0; i < count; i++) {
      rows[k * count + i] = UNITS_PER_DEPTH * depthOf(mass * amounts[first + i]!);
    }
  }
  return { first, count, rows };
}

/** Adds the band's slant depth at `mass` to `depths`. */
export function addBand(band: BandRows, mass: number, depths: Float64Array): void {
  const { first, count, rows } = band;
  if (count === 0) return;
  const [node, a, b, c] = nodeWeights(mass);
  const three = rows.subarray(node * count, (node + 3) * count);
  addRows(three, a, b, c, depths.subarray(first, first + count));
}

/** Adds three weighted rows, one after the other in `rows`, to `sums`. */
function addRows(rows: Float64Array, a: number, b: number, c: number, sums: Float64Array): void {
  const count = sums.length;
  const third = 2 * count;
  for (let i = 0; i < count; i++) {
    sums[i] = sums[i]! + (a * rows[i]! + b * rows[count + i]! + c * rows[third + i]!);
  }
}
