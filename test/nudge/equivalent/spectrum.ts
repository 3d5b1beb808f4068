/** Literals of the room `spectrum` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const SPECTRUM: readonly Equivalent[] = [];
