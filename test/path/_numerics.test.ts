import { describe, expect, it } from "vitest";
import { standardProfile } from "../../src/index.js";
import { fitPieces } from "../../src/path/_fitPieces.js";
import { lowestPoint } from "../../src/path/_lowestPoint.js";
import { atPiece, chebyshevNode, NODES, piecesThrough } from "../../src/path/_pieces.js";
import { layerAt, rayAir, refractivityAt } from "../../src/path/_rayAir.js";
import {
  nearSine,
  risingElevation,
  risingPlace,
  risingReach,
} from "../../src/path/_risingPlace.js";
import { expectAbsolute } from "../_tolerance.js";

describe("pieces", () => {
  it("run through every polynomial of degree 7", () => {
    for (let power = 0; power < NODES; power++) {
      const values = Float64Array.from({ length: NODES }, (_, k) => chebyshevNode(k) ** power);
      const coefficients = piecesThrough(values);
      // powers up to 64 times coefficients of 1/8: some roundings of 64
      for (let x = 0; x <= 1; x += 0.01)
        expectAbsolute(atPiece(coefficients, 1, x), (2 * x - 1) ** power, 1e-13);
    }
  });
  it("double until every piece and quantity is close, the first too", () => {
    const steep = (place: number, pieces: number): number => 1 / (0.02 + place / pieces);
    const fit = fitPieces(1, 1, 1e-8, (place, pieces) => [steep(place, pieces)]);
    expect(fit.pieces).toBeGreaterThan(2);
    for (let x = 0; x <= 1; x += 1e-3) {
      const found = atPiece(fit.coefficients[0]!, fit.pieces, x * fit.pieces);
      expectAbsolute(found, steep(x, 1), 1.2e-8); // asked for in the middle of each piece
    }
  });
});

describe("the variable of rising rays", () => {
  it("nearSine is the sine of a quarter turn per span within 2.8e-11", () => {
    for (const span of [90, 90.6])
      for (let z = 0; z <= span; z += span / 997)
        expectAbsolute(nearSine(z, span), Math.sin((z / span) * (Math.PI / 2)), 2.8e-11);
  });
  it("the reach is the sine of the elevation within 2.6e-9, and the bend", () => {
    for (const span of [90, 90.6]) {
      for (let e = 0; e <= span; e += span / 997) {
        const sine = Math.sin((e / span) * (Math.PI / 2));
        expectAbsolute(risingReach(e, span, 1 / (span * span)) - 0.08, sine, 2.6e-9);
      }
    }
  });
  it("places lead back to their elevations", () => {
    for (let e = 0; e <= 90; e += 0.37) {
      const place = risingPlace(1 / risingReach(e, 90, 1 / 8100), 16);
      expectAbsolute(risingElevation(place, 90, 16), e, e > 89.9 ? 1e-5 : 1e-10);
    }
  });
});

describe("where a falling ray turns", () => {
  const profile = standardProfile({
    ...{ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, altitudeM: 0, co2Ppm: 425 },
  });
  const air = rayAir(profile, [], 550, 6_371_000, 30_000);
  const product = (heightM: number): number =>
    (1 + refractivityAt(air, layerAt(air, heightM), heightM, new Float64Array(3))) *
    (6_371_000 + heightM);
  const kinks = air.kinksM.filter((heightM) => heightM > 0 && heightM < 30_000);
  it.each(kinks.flatMap((kinkM) => [kinkM + 0.3, kinkM - 0.3, kinkM - 40]))(
    "is found close to a kink of the air: %d m",
    (heightM) => {
      const deficit = 1 - product(heightM) / product(30_000);
      // 2e-16 of n r is 1.4 nm; n r grows by 0.7 to 1 m each metre
      expectAbsolute(lowestPoint(air, deficit)!, heightM, 1e-8);
    },
  );
});
