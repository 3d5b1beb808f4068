/** Weighted sum of prepared paths that share their pieces. */
import type { DippingFit, PathFit, PreparedPath } from "./preparedPath.js";

export function blendPaths<Key extends string>(
  paths: readonly PreparedPath<Key>[],
  weights: readonly number[],
): PreparedPath<Key> {
  const mix = (of: (path: PreparedPath<Key>) => number): number =>
    weights.reduce((sum, weight, i) => sum + weight * of(paths[i]!), 0);
  const mixFit = (of: (path: PreparedPath<Key>) => PathFit): PathFit => ({
    pieces: of(paths[0]!).pieces,
    coefficients: mixTables(
      paths.map((path) => of(path).coefficients),
      weights,
    ),
  });
  return {
    ...paths[0]!,
    horizonApparentZenithDeg: 90 + mix((path) => path.horizonApparentZenithDeg - 90),
    horizonTrueZenithDeg: mix((path) => path.horizonTrueZenithDeg),
    levelRefractionDeg: mix((path) => path.levelRefractionDeg),
    rising: mixFit((path) => path.rising),
    risingTrue: mixFit((path) => path.risingTrue),
    dipping: paths[0]!.dipping.map(
      (_, i): DippingFit => ({
        ...mixFit((path) => path.dipping[i]!),
        topDeg: mix((path) => path.dipping[i]!.topDeg),
        bottomDeg: mix((path) => path.dipping[i]!.bottomDeg),
      }),
    ),
  };
}

function mixTables(
  tables: readonly (readonly Float64Array[])[],
  weights: readonly number[],
): Float64Array[] {
  return tables[0]!.map((first, q) => {
    const mixed = new Float64Array(first.length);
    for (const [i, weight] of weights.entries()) {
      const table = tables[i]![q]!;
      for (let k = 0; k < mixed.length; k++) mixed[k]! += weight * table[k]!;
    }
    return mixed;
  });
}
