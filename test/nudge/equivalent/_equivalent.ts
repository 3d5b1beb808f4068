/** Form of an explanation why a changed literal is right to go unnoticed. */

/** Literals, found by their file and a piece of their line. */
export interface Equivalent {
  readonly path: string;
  readonly line: string;
  readonly literals: readonly string[];
  readonly why: string;
}
