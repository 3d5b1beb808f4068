import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { tabulate, wavelengthGrid } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectRefusal, ulpsApart } from "../_tolerance.js";

describe("wavelengthGrid", () => {
  it("includes both ends", () => {
    expect([...wavelengthGrid(380, 400, 5)]).toEqual([380, 385, 390, 395, 400]);
    expect([...wavelengthGrid(500, 500, 1)]).toEqual([500]);
    expect(wavelengthGrid(380, 780, 5)).toHaveLength(81);
    expect(wavelengthGrid(380, 780, 1)).toHaveLength(401);
    expect(wavelengthGrid(300, 1100, 1)).toHaveLength(801);
  });
  it("keeps the stop when the step is no binary fraction, and never passes it", () => {
    const tenths = wavelengthGrid(300, 1000, 0.1);
    expect(tenths).toHaveLength(7001);
    expect(tenths[7000]).toBe(1000);
    const worst = Math.max(...tenths.map((w, i) => ulpsApart(w, (3000 + i) / 10)));
    expect(worst).toBeLessThanOrEqual(1); // two roundings
  });
  it("ends below a stop that is off the grid", () => {
    expect([...wavelengthGrid(400, 409, 4)]).toEqual([400, 404, 408]);
    expect([...wavelengthGrid(400, 401, 4)]).toEqual([400]);
  });
  it("rises by the step everywhere (properties)", () => {
    fc.assert(
      fc.property(between(1, 3000), between(0, 900), between(0.5, 60), (start, span, step) => {
        const grid = wavelengthGrid(start, start + span, step);
        expect(grid[0]).toBe(start);
        expect(grid.at(-1)).toBeLessThanOrEqual(start + span);
        expect(grid.at(-1)! + step).toBeGreaterThan(start + span - 1e-9 * step);
        for (let i = 1; i < grid.length; i++) {
          // one rounding of the product and one of the sum, at most 4000 nm; the last may end on the stop, as the comment says
          const most = i === grid.length - 1 ? 2e-12 + 1e-9 * step : 2e-12;
          expect(Math.abs(grid[i]! - grid[i - 1]! - step)).toBeLessThan(most);
        }
      }),
    );
  });
  it("refuses bad input", () => {
    expectRefusal(() => wavelengthGrid(0.38, 780, 5), RangeError, "startNm", "µm?", "0.38");
    expectRefusal(() => wavelengthGrid(500, 400, 5), RangeError, "stopNm", "500 to", "400");
    expectRefusal(() => wavelengthGrid(400, 700, 0), RangeError, "stepNm", "greater than 0 nm");
    expectRefusal(() => wavelengthGrid(400, 700, -1), RangeError, "stepNm", "-1");
    expectRefusal(() => wavelengthGrid(400, 700, Number.NaN), RangeError, "stepNm", "NaN");
    expectRefusal(() => wavelengthGrid(400, 700, 1e-9), RangeError, "stepNm", "10 million");
    expectRefusal(() => wavelengthGrid(1, 10_000_001, 1), RangeError, "at least 1 nm here");
    expectRefusal(() => wavelengthGrid(400, 700, "5" as never), TypeError, "stepNm", '"5"');
    expectRefusal(() => wavelengthGrid(Number.NaN, 700, 5), RangeError, "startNm");
    expectRefusal(() => wavelengthGrid(400, 700, Number.POSITIVE_INFINITY), RangeError, "stepNm");
  });
});

describe("tabulate", () => {
  it("asks the quantity at each wavelength in order and keeps what it says, NaN too", () => {
    const asked: number[] = [];
    const spectrum = tabulate(
      (wavelengthNm) => {
        asked.push(wavelengthNm);
        return wavelengthNm === 500 ? Number.NaN : 2 * wavelengthNm;
      },
      [400, 500, 600],
    );
    expect(asked).toEqual([400, 500, 600]);
    expect([...spectrum.values]).toEqual([800, Number.NaN, 1200]);
    expect([...spectrum.wavelengthsNm]).toEqual([400, 500, 600]);
    expect(spectrum.values).toBeInstanceOf(Float64Array);
  });
  it("keeps a Float64Array of wavelengths and copies a plain array", () => {
    const grid = Float64Array.of(400, 500);
    expect(tabulate(() => 1, grid).wavelengthsNm).toBe(grid);
    const plain = [400, 500];
    const spectrum = tabulate(() => 1, plain);
    plain[0] = 450;
    expect(spectrum.wavelengthsNm[0]).toBe(400);
  });
  it("takes a single wavelength", () => {
    expect([...tabulate((w) => w, [550]).values]).toEqual([550]);
  });
  it("refuses bad input", () => {
    expectRefusal(() => tabulate(5 as never, [400]), TypeError, "tabulate", "function");
    expectRefusal(() => tabulate(() => 1, 400 as never), TypeError, "wavelengthsNm");
    expectRefusal(() => tabulate(() => 1, []), RangeError, "at least 1");
    expectRefusal(() => tabulate(() => 1, [400, 400]), RangeError, "wavelengthsNm[1]", "400");
    expectRefusal(() => tabulate(() => 1, [500, 400]), RangeError, "wavelengthsNm[1]", "500 nm");
    expectRefusal(() => tabulate(() => 1, [-1]), RangeError, "wavelengthsNm[0]", "above 0 nm");
    expectRefusal(() => tabulate(() => 1, [400, Number.NaN]), RangeError, "NaN");
    expectRefusal(() => tabulate(() => 1, [400, Number.POSITIVE_INFINITY]), RangeError, "Infinity");
    expectRefusal(() => tabulate(() => 1, [400, "500" as never]), TypeError, '"500"');
  });
  it("lets the quantity's own error through", () => {
    expect(() =>
      tabulate(() => {
        throw new RangeError("too blue");
      }, [400]),
    ).toThrow("too blue");
  });
});
