/** Literals of the room `absorption` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const ABSORPTION: readonly Equivalent[] = [];
