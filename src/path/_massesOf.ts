/** What a ray collects over what stands above the observer. */
import type { RayAir } from "./_rayAir.js";
import { verticalColumns } from "./_traceRay.js";

export function massesOf(
  air: RayAir,
  keys: readonly string[],
  sums: Float64Array,
  functionName: string,
): { airMass: number; masses: Record<string, number> } {
  const columns = checkedColumns(air, keys, functionName);
  const masses: Record<string, number> = {};
  for (const [i, key] of keys.entries()) masses[key] = sums[i + 2]! / columns[i + 2]!;
  return { airMass: sums[1]! / columns[1]!, masses };
}

/** The vertical columns, none of them empty. */
export function checkedColumns(
  air: RayAir,
  keys: readonly string[],
  functionName: string,
): Float64Array {
  const columns = verticalColumns(air);
  for (const [i, key] of keys.entries()) {
    if (columns[i + 2]! > 0) continue;
    throw new RangeError(
      `${functionName}: constituents.${key} must have something above the observer at ${air.observerM} m, got an empty column (masses are ratios to it)`,
    );
  }
  return columns;
}
