/** Literals of the room `beam` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const BEAM: readonly Equivalent[] = [];
