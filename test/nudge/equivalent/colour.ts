/** Literals of the room `colour` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const COLOUR: readonly Equivalent[] = [];
