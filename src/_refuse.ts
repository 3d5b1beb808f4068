/** The throw of every guard, apart from them so that a small function can carry it alone. */

/** Throws the error for a value outside `range` (a text with its unit); `hint` names a likely slip. */
export function refuse(
  value: unknown,
  range: string,
  hint: string,
  argument: string,
  functionName: string,
): never {
  const text = `${functionName}: ${argument} must be ${range}, got ${show(value)}${hint && ` (${hint})`}`;
  throw new (typeof value === "number" ? RangeError : TypeError)(text);
}

/** A value as an error names it. */
export function show(value: unknown): string {
  if (typeof value === "string") return `the text "${value}"`;
  if (Array.isArray(value)) return `an array of ${value.length}`;
  return Object(value) === value ? "an object" : String(value);
}
