/** The fit of rising rays over their true elevations. */
import { apparentElevation, massAt, refractionAt } from "./_atElevation.js";
import { RISING_TOLERANCE, resolution, scaled } from "./_fitResolution.js";
import { fitPieces } from "./_fitPieces.js";
import { nearSine, risingElevation, risingReach } from "./_risingPlace.js";
import type { PathFit, PreparedPath } from "./preparedPath.js";

/** The rising rays again over their true elevations, from the fit over apparent ones. */
export function fitRisingTrue(path: PreparedPath<string>, like?: PathFit): PathFit {
  const [fewest, tolerance] = resolution(like, path.rising.pieces, RISING_TOLERANCE);
  const span = 90 + path.levelRefractionDeg;
  const quantities = path.rising.coefficients.length;
  return fitPieces(quantities, fewest, tolerance, (place, pieces) => {
    const above = risingElevation(place, span, pieces);
    const elevation = Math.max(0, apparentElevation(path, above - path.levelRefractionDeg));
    const values = new Float64Array(quantities);
    values[0] = refractionAt(path, elevation);
    for (let q = 1; q < quantities; q++) values[q] = massAt(path, elevation, q);
    return scaled(
      values,
      risingReach(above, span, 1 / (span * span)),
      nearSine(span - above, span),
    );
  });
}
