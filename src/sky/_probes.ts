/** All rays from all points of the twilight grid. */
import { cos, sin } from "../_numeric.js";
import { RADIANS_PER_DEGREE } from "../units.js";
import { gaussNodes } from "./_nodes.js";
import { polarDirections } from "./_polarDirections.js";
import { NOWHERE, type Probe } from "./_probe.js";
import type { ShellSky } from "./_rays.js";
import { ANGLES, gridAngle, gridHeight, HEIGHTS } from "./_twilightGrid.js";

/** Azimuths on one side of the sun's vertical plane; the other side mirrors it. */
const AZIMUTHS = 5;
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
