/** Ten thousand spectra to display colours. */
import {
  cie1931Observer,
  cie1931Observer5nm,
  encodeSrgb,
  fitToDisplay,
  planckRadiance,
  spectraToXyz,
  spectrumToXyz,
  wavelengthGrid,
  xyzToLinearSrgb,
} from "../../dist/index.js";

const SPECTRA = 10_000;
/** Of them in one timed call, others at each: long samples would measure what else the machine is doing. */
const PART = 500;

function turning(work) {
  let call = 0;
  return () => (work((call++ % (SPECTRA / PART)) * PART) > 0 ? PART : 0);
}

/** The cases for spectra of 380 to 780 nm at the observer's own step. */
function casesOf(observer) {
  const grid = wavelengthGrid(380, 780, observer.stepNm);
  const points = grid.length;
  const spectra = new Float64Array(SPECTRA * points);
  for (let s = 0; s < SPECTRA; s++)
    for (let i = 0; i < points; i++)
      spectra[s * points + i] = planckRadiance(grid[i], 2000 + s) * (1 + 0.2 * Math.sin(i + s));
  const list = Array.from({ length: SPECTRA }, (_, s) => ({
    wavelengthsNm: grid,
    values: spectra.subarray(s * points, (s + 1) * points),
  }));
  const [xBar, yBar, zBar] = ["x", "y", "z"].map((axis) => sampled(observer, axis, grid));
  const xyz = new Float64Array(3 * PART);

  /** From tristimulus values, brightness taken out, to the three numbers of a pixel. */
  const display = (x, y, z) => encodeSrgb(fitToDisplay(xyzToLinearSrgb([x / y, 1, z / y])));

  function bulk(from) {
    const part = spectra.subarray(from * points, (from + PART) * points);
    spectraToXyz(part, grid, observer, xyz);
    let sum = 0;
    for (let k = 0; k < xyz.length; k += 3) sum += display(xyz[k], xyz[k + 1], xyz[k + 2])[1];
    return sum;
  }
  function oneByOne(from) {
    let sum = 0;
    for (let s = from; s < from + PART; s++) {
      const [x, y, z] = spectrumToXyz(list[s], observer);
      sum += display(x, y, z)[1];
    }
    return sum;
  }
  function dotProducts(from) {
    let sum = 0;
    for (let s = from; s < from + PART; s++) {
      const row = s * points;
      let x = 0;
      let y = 0;
      let z = 0;
      for (let i = 0; i < points; i++) {
        const value = spectra[row + i];
        x += value * xBar[i];
        y += value * yBar[i];
        z += value * zBar[i];
      }
      sum += x + y + z;
    }
    return sum;
  }
  const shape = { beside: "three dot products", count: PART, naive: turning(dotProducts) };
  return [
    {
      title: `spectraToXyz to display colour, ${points} points`,
      ...shape,
      ours: turning(bulk),
      target: 1.5,
    },
    {
      title: `spectrumToXyz to display colour, ${points} points`,
      ...shape,
      ours: turning(oneByOne),
      target: 1.5,
    },
  ];
}

/** A function of the observer at the wavelengths of a spectrum, straight lines between its rows. */
function sampled({ startNm, stepNm, ...functions }, axis, grid) {
  const rows = functions[axis];
  return grid.map((nm) => {
    const place = (nm - startNm) / stepNm;
    const i = Math.min(rows.length - 2, Math.floor(place));
    return rows[i] + (place - i) * (rows[i + 1] - rows[i]);
  });
}

export const colour = [...casesOf(cie1931Observer5nm), ...casesOf(cie1931Observer)];
