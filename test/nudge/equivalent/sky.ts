/** Literals of the room `sky` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const SKY: readonly Equivalent[] = [];
