/** The sky of the explore page beside one computed five times as finely. */
import {
  airColumn,
  chromaticity,
  cie1931Observer5nm,
  depolarisation,
  illuminateSky,
  ozoneOpticalDepth,
  prepareSky,
  rayleighOpticalDepth,
  skyRadiance,
  solarIrradiance,
  spectrumToXyz,
  standardAtmosphere,
  tabulate,
  wavelengthGrid,
} from "airlight";
import { expect, it } from "vitest";
import { ARC_DEG, GROUND_ALBEDO, prepareArc, skyArc } from "../../docs/explore/skyArc.js";

it.each([
  [2, 0, 320],
  [5, 0, 500],
  [10, 2000, 300],
  [30, 0, 320],
  [60, 4000, 200],
  [89, 5000, 100],
])("is within 1 %% and 0.003 of it: sun %d° high, %d m, %d DU", (heightDeg, altitudeM, ozoneDu) => {
  const co2Ppm = 425;
  const arc = skyArc(prepareArc({ heightDeg, altitudeM, ozoneDu, co2Ppm, haze: 0 }), heightDeg)!;
  const { pressurePa } = standardAtmosphere(altitudeM);
  const column = airColumn({ pressurePa, altitudeM, latitudeDeg: 45, co2Ppm });
  const grid = wavelengthGrid(380, 780, 5);
  const skies = Array.from(grid, (nm) => {
    const air = rayleighOpticalDepth(nm, column);
    const layers = [
      { rayleighDepth: 0.1 * air, absorptionDepth: ozoneOpticalDepth(nm, ozoneDu, 228) },
      { rayleighDepth: 0.9 * air, absorptionDepth: 0 },
    ];
    const sky = { layers, depolarisation: depolarisation(nm, co2Ppm), groundAlbedo: GROUND_ALBEDO };
    return illuminateSky(prepareSky({ ...sky, streams: 32 }), 90 - heightDeg);
  });
  for (const [k, angle] of ARC_DEG.entries()) {
    const view = { viewZenithDeg: Math.abs(angle), relativeAzimuthDeg: angle < 0 ? 180 : 0 };
    const seen = tabulate(
      (nm) => skyRadiance(skies[grid.indexOf(nm)]!, { ...view, at: "ground" }, solarIrradiance(nm)),
      grid,
    );
    const fine = spectrumToXyz(seen, cie1931Observer5nm);
    expect(Math.abs(arc[k]![1] / fine[1] - 1)).toBeLessThan(0.01);
    const [here, there] = [chromaticity(arc[k]!), chromaticity(fine)];
    expect(Math.hypot(here[0] - there[0], here[1] - there[1])).toBeLessThan(0.003);
  }
});
