/** What the tests use of culori, which ships no types. */
declare module "culori" {
  export function converter(
    mode: string,
  ): (colour: Record<string, number | string>) => Record<string, number>;
}
