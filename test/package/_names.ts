/** The public names of every subpath, and for each function or table the bytes it may cost alone in a bundle (minified). `npm run sizes` prints the present ones. */

/** What a subpath exports. */
export interface PublicNames {
  /** Functions, tables and constants with their ceilings in bytes. */
  readonly values: Readonly<Record<string, number>>;
  /** Interfaces and type aliases. */
  readonly types: readonly string[];
}

export const PUBLIC_NAMES: Readonly<Record<string, PublicNames>> = {};
