/** The cross-section over a spectrum. */
import { rayleighCrossSection } from "../../dist/index.js";

const COUNT = 801;
/** Calls `work` with a first wavelength that is a little different at each call. */
function turning(work) {
  let call = 0;
  return () => work(300 + (call++ % 89) * 1e-3);
}

/** The paper's equations in one loop, products only, nothing checked. */
function products(from) {
  let sum = 0;
  for (let i = 0; i < COUNT; i++) {
    const nm = from + i;
    const s = 1e6 / (nm * nm);
    const n300 = 1e-8 * (8060.51 + 2480990 / (132.274 - s) + 17455.7 / (39.32957 - s));
    const n = 1 + n300 * (1 + 0.54 * (425e-6 - 300e-6));
    const n2 = n * n;
    const king =
      (78.084 * (1.034 + 3.17e-4 * s) +
        20.946 * (1.096 + 1.385e-3 * s + 1.448e-4 * s * s) +
        0.934 +
        0.0425 * 1.15) /
      (78.084 + 20.946 + 0.934 + 0.0425);
    const ratio = (n2 - 1) / (n2 + 2);
    const wave = s * 1e12;
    sum += (((744.1506403271956 * wave * wave * ratio * ratio) / 2.546899e25) * king) / 2.546899e25;
  }
  return sum;
}

/** The same as it is usually typed: powers, an options object, the index worked out in a function of its own. */
function powers(from) {
  const indexOf = ({ um, co2 }) =>
    1 +
    1e-8 *
      (8060.51 + 2480990 / (132.274 - um ** -2) + 17455.7 / (39.32957 - um ** -2)) *
      (1 + 0.54 * (co2 - 0.0003));
  let sum = 0;
  for (let i = 0; i < COUNT; i++) {
    const um = (from + i) / 1000;
    const n = indexOf({ um, co2: 425e-6 });
    const king =
      (78.084 * (1.034 + 3.17e-4 * um ** -2) +
        20.946 * (1.096 + 1.385e-3 * um ** -2 + 1.448e-4 * um ** -4) +
        0.934 +
        0.0425 * 1.15) /
      (78.084 + 20.946 + 0.934 + 0.0425);
    sum +=
      ((24 * Math.PI ** 3 * (n ** 2 - 1) ** 2) /
        ((um * 1e-6) ** 4 * 2.546899e25 ** 2 * (n ** 2 + 2) ** 2)) *
      king;
  }
  return sum;
}

function ours(from) {
  let sum = 0;
  for (let i = 0; i < COUNT; i++) sum += rayleighCrossSection(from + i, 425);
  return sum;
}

export const scattering = [
  {
    title: "rayleighCrossSection, 801 wavelengths",
    beside: "a loop of products",
    count: COUNT,
    ours: turning(ours),
    naive: turning(products),
    target: 1.3,
  },
  {
    title: "rayleighCrossSection, 801 wavelengths",
    beside: "the formula with **",
    count: COUNT,
    ours: turning(ours),
    naive: turning(powers),
  },
];
