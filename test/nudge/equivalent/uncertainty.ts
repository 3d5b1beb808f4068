/** Literals of the room `uncertainty` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const UNCERTAINTY: readonly Equivalent[] = [];
