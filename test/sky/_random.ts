/** Seeded random numbers for the Monte Carlo tests. */

/** A source of numbers evenly spread over (0, 1): a 32-bit counter well mixed, two words a number. */
export function randomSource(seed: number): () => number {
  let state = seed >>> 0;
  const word = (): number => {
    state = (state + 0x9e3779b9) >>> 0;
    let z = state;
    z = Math.imul(z ^ (z >>> 16), 0x21f0aaad);
    z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
    return (z ^ (z >>> 15)) >>> 0;
  };
  return () => (word() + (word() + 0.5) / 4294967296) / 4294967296;
}
