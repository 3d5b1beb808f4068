/** Literals of the room `scattering` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const SCATTERING: readonly Equivalent[] = [];
