/** Ciddor's index over a spectrum, for one state and for a new state each time. */
import { moistAir, refractiveIndexCiddor } from "../../dist/index.js";

const COUNT = 801;
/** Calls `work` with a first wavelength that is a little different at each call. */
function turning(work) {
  let call = 0;
  return () => work(300 + (call++ % 89) * 1e-3);
}
const state = (i) => ({
  pressurePa: 101325 + (i % 83),
  temperatureK: 288.15 + (i % 71) * 0.01,
  relativeHumidity: 0.5,
  co2Ppm: 425,
});
const prepared = moistAir(state(0));

function ours(from) {
  let sum = 0;
  for (let i = 0; i < COUNT; i++) sum += refractiveIndexCiddor(from + i, prepared) - 1;
  return sum;
}

/** The two dispersions with the state's factors at hand, products only, nothing checked. */
function products(from) {
  const { dryFactor, vapourFactor } = prepared;
  let sum = 0;
  for (let i = 0; i < COUNT; i++) {
    const nm = from + i;
    const s = 1e6 / (nm * nm);
    const dry = 5792105 / (238.0185 - s) + 167917 / (57.362 - s);
    const vapour = 1.022 * (295.235 + s * (2.6422 + s * (-0.03238 + s * 0.004028)));
    sum += 1 + 1e-8 * (dryFactor * dry + vapourFactor * vapour) - 1;
  }
  return sum;
}

/** The state handed over as it is measured and worked out at each wavelength. */
function everyTime(from) {
  let sum = 0;
  for (let i = 0; i < COUNT; i++) sum += refractiveIndexCiddor(from + i, moistAir(state(0))) - 1;
  return sum;
}

export const air = [
  {
    title: "refractiveIndexCiddor, 801 wavelengths",
    beside: "a loop of products",
    count: COUNT,
    ours: turning(ours),
    naive: turning(products),
    target: 1.3,
  },
  {
    title: "refractiveIndexCiddor, 801 wavelengths",
    beside: "the state worked out each time",
    count: COUNT,
    ours: turning(ours),
    naive: turning(everyTime),
  },
];
