/** Literals of the room `path` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const PATH: readonly Equivalent[] = [];
