/** Literals whose change cannot show in any result, each with the reason. */

/** A literal, found by its file and a piece of its line. */
export interface Equivalent {
  readonly path: string;
  readonly line: string;
  readonly literal: string;
  readonly why: string;
}

export const EQUIVALENT: readonly Equivalent[] = [];
