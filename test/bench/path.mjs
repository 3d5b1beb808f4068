/** The prepared path over an array of angles beside each closed formula in a loop, and beside the ray itself. */
import {
  airMassesOnPath,
  airMassesOnTruePath,
  constituentMassesOnPath,
  exponentialLayer,
  gaussianLayer,
  preparePath,
  refractedPath,
  refractionsOnPath,
  standardProfile,
} from "../../dist/index.js";

const COUNT = 4000;
const TURNS = 7;
const DEGREE = Math.PI / 180;
const weather = { pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0.5, co2Ppm: 425 };
const constituents = {
  ozone: gaussianLayer({ heightM: 22000, standardDeviationM: 5000 }),
  water: exponentialLayer({ scaleHeightM: 2000 }),
};
const input = {
  profile: standardProfile({ ...weather, altitudeM: 0 }),
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
  constituents,
};
const prepared = preparePath(input);
/** Angles in no order, others at each call. */
const angles = Array.from({ length: TURNS }, (_, turn) =>
  Float64Array.from({ length: COUNT }, (_, i) => 90 * (((i + 1) * 0.6180339887 + turn * 0.1) % 1)),
);
const out = new Float64Array(COUNT);

/** Each call fills `out` for other angles; what is returned only says that it was filled. */
function turning(fill) {
  let call = 0;
  return () => {
    fill(angles[call++ % TURNS]);
    return out[COUNT - 1] > 0 ? COUNT : 0;
  };
}

/** A formula of one angle in a plain loop, nothing checked, powers by Math.pow as books print them. */
function looped(formula) {
  return turning((zeniths) => {
    for (let i = 0; i < COUNT; i++) out[i] = formula(zeniths[i]);
  });
}

const kastenYoung = (z) => 1 / (Math.cos(z * DEGREE) + 0.50572 * Math.pow(96.07995 - z, -1.6364));
const kasten = (z) => 1 / (Math.cos(z * DEGREE) + 0.15 * Math.pow(93.885 - z, -1.253));
const kastenWater = (z) => 1 / (Math.cos(z * DEGREE) + 0.0548 * Math.pow(92.65 - z, -1.452));
const young = (z) => {
  const c = Math.cos(z * DEGREE);
  return (
    (1.002432 * c * c + 0.148386 * c + 0.0096467) /
    (c * c * c + 0.149864 * c * c + 0.0102963 * c + 0.000303978)
  );
};
const pickering = (z) => 1 / Math.sin((90 - z + 244 / (165 + 47 * Math.pow(90 - z, 1.1))) * DEGREE);
const rozenberg = (z) => {
  const c = Math.cos(z * DEGREE);
  return 1 / (c + 0.025 * Math.exp(-11 * c));
};
const shell = (z) => {
  const sine = Math.sin(z * DEGREE) * (6371008.8 / 6393008.8);
  return 1 / Math.sqrt(1 - sine * sine);
};
const bennett = (z) => 1 / Math.tan((90 - z + 7.31 / (94.4 - z)) * DEGREE) / 60;

const masses = turning((zeniths) => airMassesOnPath(zeniths, prepared, out));
const trueMasses = turning((zeniths) => airMassesOnTruePath(zeniths, prepared, out));
const ozone = turning((zeniths) => constituentMassesOnPath(zeniths, prepared, "ozone", out));
const water = turning((zeniths) => constituentMassesOnPath(zeniths, prepared, "water", out));
const refractions = turning((zeniths) => refractionsOnPath(zeniths, prepared, out));

const row = (title, beside, ours, naive, target) => ({
  ...{ title, beside, count: COUNT, ours, naive },
  ...(target === undefined ? {} : { target }),
});

/** The ray at a hundred angles, and the prepared path at as many. */
const RAYS = 100;
const rays = turning((zeniths) => {
  for (let i = 0; i < RAYS; i++) out[i] = refractedPath(zeniths[i], input).airMass;
});
const some = turning((zeniths) => airMassesOnPath(zeniths.subarray(0, RAYS), prepared, out));

let state = 0;
/** A state each time. */
function prepareAnother() {
  const profile = standardProfile({ ...weather, temperatureK: 280 + (state++ % 17), altitudeM: 0 });
  return preparePath({ ...input, profile }).rising.coefficients.length;
}
/** As many rays as the fit of rising rays needs at least. */
function raysOfIt() {
  let last = 0;
  for (let i = 0; i < 64; i++) last = refractedPath(angles[0][i], input).airMass;
  return last > 0 ? 4 : 0;
}

export const path = [
  row("airMassesOnPath", "Kasten & Young with Math.pow", masses, looped(kastenYoung), 0.25),
  row("airMassesOnPath", "Kasten 1965", masses, looped(kasten)),
  row("airMassesOnPath", "Pickering 2002", masses, looped(pickering)),
  row("airMassesOnPath", "Rozenberg 1966", masses, looped(rozenberg)),
  row("airMassesOnTruePath", "Young 1994", trueMasses, looped(young)),
  row("constituentMassesOnPath, ozone", "a thin shell", ozone, looped(shell)),
  row("constituentMassesOnPath, water", "Kasten's water", water, looped(kastenWater)),
  row("refractionsOnPath", "Bennett 1982", refractions, looped(bennett)),
  { ...row("airMassesOnPath, 100 angles", "100 rays", some, rays), count: RAYS },
  { ...row("preparePath, a new state", "64 rays", prepareAnother, raysOfIt), count: 1 },
];
