/** The step from one source component to two. */
import type { DecayModes } from "./_decayModes.js";
import type { ModeKernel } from "./_kernel.js";
import { type Eigensystem, rankOneDowndate } from "./_secular.js";
import type { Zeros } from "./_zeros.js";

/** The second outer product of mode 0, in the basis the first one left: its vectors, and the bare second components between them. */
export function secondDowndate(
  zeros: Zeros,
  kernel: ModeKernel,
  scale: number,
  nodePoles: Float64Array,
  before: DecayModes,
): DecayModes {
  const { size, secants } = kernel;
  const count = size / 2;
  const poles = zeros(size);
  const vector = zeros(size);
  for (let i = 0; i < count; i++) {
    poles[2 * i] = before.values[i]!;
    poles[2 * i + 1] = nodePoles[i]!;
    let sum = 0;
    for (let j = 0; j < count; j++) {
      sum += before.vectors[i * count + j]! * kernel.second[j]! * secants[j]!;
    }
    vector[2 * i] = scale * sum;
    vector[2 * i + 1] = scale * kernel.second[count + i]! * secants[i]!;
  }
  return turnBack(zeros, before, rankOneDowndate(zeros, poles, vector), scale);
}

/** Eigenvectors found in the basis of the first step, back in that of the nodes. */
function turnBack(zeros: Zeros, before: DecayModes, after: Eigensystem, scale: number): DecayModes {
  const { values, vectors: turned, couplings } = after;
  const size = values.length;
  const count = size / 2;
  const vectors = zeros(size * size);
  const first = zeros(size);
  const second = zeros(size);
  for (let m = 0; m < size; m++) {
    const row = m * size;
    second[m] = couplings[m]! / scale;
    for (let i = 0; i < count; i++) {
      const part = turned[row + 2 * i]!;
      first[m]! += part * before.first[i]!;
      for (let j = 0; j < count; j++) vectors[row + j]! += part * before.vectors[i * count + j]!;
      vectors[row + count + i] = turned[row + 2 * i + 1]!;
    }
  }
  return { values, vectors, first, second };
}
