/** A worker of the page: the sky's radiance at one wavelength in all directions. */
import {
  airColumn,
  depolarisation,
  illuminateSky,
  ozoneOpticalDepth,
  prepareSky,
  rayleighOpticalDepth,
  skyStokesMap,
  solarIrradiance,
} from "../../dist/index.js";

const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
const prepared = new Map();
let directions;

/** The sky at a wavelength does not depend on the sun: it is prepared once. */
function skyAt(wavelengthNm) {
  let sky = prepared.get(wavelengthNm);
  if (sky === undefined) {
    const ozone = ozoneOpticalDepth(wavelengthNm, 330, 225);
    const air = rayleighOpticalDepth(wavelengthNm, column);
    // nine tenths of the ozone above a tenth of the air
    const layers = [
      { rayleighDepth: 0.1 * air, absorptionDepth: 0.9 * ozone },
      { rayleighDepth: 0.9 * air, absorptionDepth: 0.1 * ozone },
    ];
    sky = prepareSky({
      layers,
      depolarisation: depolarisation(wavelengthNm, 425),
      groundAlbedo: 0.15,
      streams: 24,
    });
    prepared.set(wavelengthNm, sky);
  }
  return sky;
}

self.onmessage = ({ data }) => {
  if (data.directions !== undefined) {
    directions = data.directions;
    return;
  }
  const { w, wavelengthNm, sunZenithDeg } = data;
  const map = skyStokesMap(illuminateSky(skyAt(wavelengthNm), sunZenithDeg), directions);
  const scale = solarIrradiance(wavelengthNm) / Math.PI;
  const values = new Float64Array(map.length / 3);
  for (let i = 0; i < values.length; i++) values[i] = scale * map[3 * i];
  self.postMessage({ w, values }, [values.buffer]);
};
