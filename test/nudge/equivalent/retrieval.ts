/** Literals of the room `retrieval` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const RETRIEVAL: readonly Equivalent[] = [];
