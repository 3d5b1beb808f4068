/** Literals of the room `column` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const COLUMN: readonly Equivalent[] = [];
