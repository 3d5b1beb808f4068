/** All rays from all points of the twilight grid. */
import { cos, sin } from "../_numeric.js";
import { RADIANS_PER_DEGREE } from "../units.js";
import { gaussNodes, type Nodes } from "./_nodes.js";
import { type Ray, ray, type ShellSky } from "./_rays.js";
import { ANGLES, gridAngle, gridHeight, HEIGHTS } from "./_twilightGrid.js";

/** Azimuths on one side of the sun's vertical plane; the other side mirrors it. */
const AZIMUTHS = 5;
/** Zenith angles above the horizontal, between it and the Earth's limb, and onto the ground. */
const ABOVE = 6;
const BETWEEN = 4;
const BELOW = 4;

/** One ray from one grid point under one sun. */
export interface Probe {
  /** Row and column of the grid point, and its distance from the Earth's centre, m. */
  row: number;
  column: number;
  radius: number;
  readonly groundM: number;
  ray: Ray;
  /** Solid angle the ray stands for, on both sides of the sun's plane. */
  solid: number;
  /** Cosines: sun from the vertical, ray from the vertical, ray from the sun. */
  sun: number;
  view: number;
  between: number;
  /** Two unit vectors square to the ray: the first in its vertical plane, the second horizontal (no z). */
  x1: number;
  y1: number;
  z1: number;
  x2: number;
  y2: number;
  /** Their cosines from the sun. */
  sun1: number;
  sun2: number;
}

/** A direction to look in from a grid point, without azimuth. */
interface Polar {
  readonly cosine: number;
  readonly weight: number;
  readonly ray: Ray;
}

/** Calls `visit` with every ray, of `points` points to a stretch; the probe it gets is the same record each time. */
export function visitRays(sky: ShellSky, points: number, visit: (probe: Probe) => void): void {
  const { groundM } = sky.air;
  const nodes = gaussNodes(points);
  for (let row = 0; row < HEIGHTS; row++) {
    const radius = groundM + gridHeight(row);
    for (const { cosine, weight, ray: path } of polarDirections(sky, gridHeight(row), nodes)) {
      const solid = (2 * Math.PI * weight) / AZIMUTHS;
      const probe = { ...NOWHERE, row, radius, groundM, ray: path, solid, view: cosine };
      for (let column = 0; column < ANGLES; column++) visitAzimuths(probe, column, visit);
    }
  }
}

const NOWHERE = {
  column: 0,
  sun: 0,
  between: 0,
  x1: 0,
  y1: 0,
  z1: 0,
  x2: 0,
  y2: 0,
  sun1: 0,
  sun2: 0,
};

function visitAzimuths(probe: Probe, column: number, visit: (probe: Probe) => void): void {
  const angle = gridAngle(column) * RADIANS_PER_DEGREE;
  const sun = cos(angle);
  const sine = sin(angle);
  const { view } = probe;
  const side = Math.sqrt(1 - view * view);
  probe.column = column;
  probe.sun = sun;
  for (let k = 0; k < AZIMUTHS; k++) {
    const azimuth = (Math.PI * (k + 0.5)) / AZIMUTHS;
    const x = cos(azimuth);
    const y = sin(azimuth);
    probe.between = side * x * sine + view * sun;
    probe.x1 = view * x;
    probe.y1 = view * y;
    probe.z1 = -side;
    probe.x2 = -y;
    probe.y2 = x;
    probe.sun1 = view * x * sine - side * sun;
    probe.sun2 = -y * sine;
    visit(probe);
  }
}

/** Directions around a point at `heightM`, crowded towards its horizontal and the Earth's limb. */
function polarDirections(sky: ShellSky, heightM: number, nodes: Nodes): Polar[] {
  const ratio = sky.air.groundM / (sky.air.groundM + heightM);
  const limb = -Math.sqrt(1 - ratio * ratio);
  const parts: readonly [number, number, number][] = [
    [0, 1, ABOVE],
    [limb, 0, limb < 0 ? BETWEEN : 0],
    [limb, -1, BELOW],
  ];
  return parts.flatMap(([from, to, count]) => {
    const { cosines, weights } = gaussNodes(count);
    return Array.from(cosines, (x, k) => {
      const cosine = from + (to - from) * x * x;
      const weight = 2 * weights[k]! * x * Math.abs(to - from);
      return { cosine, weight, ray: ray(sky, heightM, cosine, nodes) };
    });
  });
}
