import { pathInWeather, rayleighCrossSection, solarIrradiance } from "airlight";
import { beforeAll, describe, expect, it } from "vitest";
import { analyseStation, type StationResult } from "../../examples/station/analyseStation.js";
import { airMasses } from "../../examples/station/airMasses.js";
import { turbidityOf } from "../../examples/station/calibrate.js";
import { channelOptics } from "../../examples/station/channelOptics.js";
import { constantUncertainty } from "../../examples/station/depthBudget.js";
import { knownTerms, NO_AEROSOL } from "../../examples/station/knownTerms.js";
import { markClouds } from "../../examples/station/markClouds.js";
import { spreadApart } from "../../examples/station/plotting.js";
import { precipitableWaterCm } from "../../examples/station/precipitableWaterCm.js";
import type { Station } from "../../examples/station/readStation.js";
import { dayPaths, stationPath } from "../../examples/station/stationPaths.js";
import { sunAt } from "../../examples/station/sunAt.js";
import { tableAsHtml, tableAsText } from "../../examples/station/table.js";
import { normal, seeded } from "../retrieval/_mornings.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";
import {
  DEMO,
  type TrueReading,
  type Truth,
  withFolder,
  writeStation,
} from "./_inventedStation.js";

describe("a station of known truth", () => {
  const truth: Truth = {
    constants: [1200, 900, 2100, 1500, 700],
    depths: [0.08, 0.2],
    exponent: 1.4,
    noise: 5e-4,
  };
  let made: TrueReading[] = [];
  let result: StationResult | undefined;
  beforeAll(() => {
    withFolder((folder) => {
      made = writeStation(folder, truth);
      result = analyseStation(folder);
    });
  });

  it("gives back the constants at 1 au and the haze of the calibration morning", () => {
    result!.calibrations.forEach(({ fit }, c) => {
      // four standard errors, which are 0.01 to 0.02 %; a mass or band forgotten costs 0.3 % and more
      expectRelative(fit.constant, truth.constants[c]!, 8e-4);
      expect(fit.constantStandardError / fit.constant).toBeLessThan(2e-4);
    });
    const { exponent, turbidity } = turbidityOf(result!.calibrations);
    expectRelative(turbidity * 0.5 ** -exponent, 0.03, 0.02); // depth at 500 nm to 0.0006
  });

  it("gives back the optical depth of every reading free of cloud, and marks the cloudy ones", () => {
    const places = result!.aerosol.map(({ depths, cloudy }, i) => ({
      ...made[i]!,
      depths,
      cloudy,
    }));
    for (const { depths, depthAt500, cloudDepth, cloudy } of places) {
      // noise of 0.05 % on an air mass of 1 is 0.0005; four of them and the error of the constant
      if (cloudDepth < 2e-4) expectAbsolute(depths[2]!, depthAt500, 0.0025);
      if (cloudDepth > 0.004) expect(cloudy).toBe(true);
    }
    const clear = places.filter(({ cloudDepth }) => cloudDepth < 1e-4);
    expect(clear.length).toBeGreaterThan(90);
    expect(clear.filter(({ cloudy }) => cloudy).length).toBeLessThanOrEqual(3);
  });

  it("states uncertainties that cover the truth, and whose lines add up", () => {
    result!.calibrations.forEach((calibration, c) => {
      const off = Math.abs(calibration.fit.constant - truth.constants[c]!);
      expect(off).toBeLessThan(1.96 * constantUncertainty(calibration));
      expectRelative(calibration.fit.constant, truth.constants[c]!, 0.0025);
    });
    let [clear, covered] = [0, 0];
    result!.aerosol.forEach(({ budgets, depths }, i) => {
      if (made[i]!.cloudDepth >= 1e-3) return;
      const { expandedUncertainty, opticalDepth, budget, standardUncertainty } = budgets[2]!;
      expect(opticalDepth).toBe(depths[2]);
      expectRelative(
        Math.hypot(...budget.map((row) => row.contribution)),
        standardUncertainty,
        1e-12,
      );
      expectAbsolute(opticalDepth, made[i]!.depthAt500, 0.004);
      clear += 1;
      // cloud of up to 0.001 counts as error
      if (Math.abs(opticalDepth - made[i]!.depthAt500) <= expandedUncertainty) covered += 1;
    });
    expect(clear).toBeGreaterThan(90);
    expect(covered / clear).toBeGreaterThanOrEqual(0.9);
  });

  it("propagates the air's uncertainty to light and colour", () => {
    const { views, viewUncertainties, air } = result!;
    views.forEach(({ illuminanceLx, trueHeightDeg }, i) => {
      const relative = viewUncertainties[i]!.illuminanceLx / illuminanceLx;
      // 1 % of sunlight, and the depth's error over the air mass, about 1 / sin height
      const depth = air.depthUncertainty / Math.sin((Math.max(5, trueHeightDeg) * Math.PI) / 180);
      expect(relative).toBeGreaterThan(0.01);
      expect(relative).toBeLessThan(0.01 + 8 * depth);
      expect(viewUncertainties[i]!.temperatureK!).toBeGreaterThan(1);
    });
  });

  it("goes forward with the air it found", () => {
    expectRelative(result!.air.exponent, 1.4, 0.03);
    const light = result!.views.map(({ illuminanceLx }) => illuminanceLx);
    expect([...light].sort((a, b) => b - a)).toEqual(light);
    // common practice: the high sun gives some 100 klx on a plane facing it, through clear air
    expect(light[0]).toBeGreaterThan(90_000);
    expect(light[0]).toBeLessThan(120_000);
  });
});

describe("the demonstration", () => {
  let result: StationResult | undefined;
  beforeAll(() => {
    result = analyseStation(DEMO);
  });

  it("fits straight lines: no bend of the residuals with air mass", () => {
    for (const { points } of result!.calibrations) {
      for (const [low, high] of [
        [1, 1.5],
        [1.5, 3],
        [3, 6],
      ] as const) {
        const residuals = points
          .filter(({ use, airMass }) => use === "kept" && airMass >= low && airMass < high)
          .map(({ residual }) => residual);
        const mean = residuals.reduce((a, b) => a + b, 0) / residuals.length;
        expect(residuals.length).toBeGreaterThan(20);
        expectAbsolute(mean, 0, 3e-4); // scatter is 5e-4: three standard errors of a mean of 25
      }
    }
  });

  it("agrees with itself: channels on one power law, whichever day and air mass", () => {
    const { calibrations, aerosol } = result!;
    const morning = turbidityOf(calibrations);
    expect(morning.exponent).toBeGreaterThan(0.5);
    expect(morning.exponent).toBeLessThan(2);
    calibrations.forEach(({ optics, fit }) => {
      const law = morning.turbidity * (optics.meanNm / 1000) ** -morning.exponent;
      expectAbsolute(fit.opticalDepth, law, 6e-4); // ozone uncertain by 5 % is 6e-4 of depth
    });
    for (const { depths, powerLaw, cloudy, reading } of aerosol) {
      if (cloudy) continue;
      calibrations.forEach(({ optics }, c) => {
        const law = powerLaw!.turbidity * (optics.meanNm / 1000) ** -powerLaw!.exponent;
        // 6e-4 as above, and four times the noise of 5e-4 over the air mass
        expectAbsolute(depths[c]!, law, 6e-4 + 2e-3 / reading.masses.aerosol);
      });
    }
  });

  it("marks what the file shows at a glance: signals halved at 12:10, 13:00 and 17:24, none at 09:00", () => {
    const at = (clock: string): boolean =>
      result!.aerosol.find(({ reading }) => reading.time.toISOString().includes(`T${clock}`))!
        .cloudy;
    expect(["12:10", "13:00", "17:24"].map(at)).toEqual([true, true, true]);
    expect(["07:00", "09:00", "15:00", "19:00"].map(at)).toEqual([false, false, false, false]);
  });
});

describe("the sun", () => {
  it("stands where the almanac's low-precision formulas put it", () => {
    // Astronomical Almanac, page C5 (from memory): declination to 0.01°, distance to about 1e-4 au
    for (const date of ["2026-06-14T13:20:00Z", "2026-12-01T09:00:00Z", "2027-03-20T15:30:00Z"]) {
      const days = Date.parse(date) / 86_400_000 + 2440587.5 - 2451545;
      const rad = Math.PI / 180;
      const g = (357.528 + 0.9856003 * days) * rad;
      const longitude =
        (280.46 + 0.9856474 * days + 1.915 * Math.sin(g) + 0.02 * Math.sin(2 * g)) * rad;
      const tilt = (23.439 - 4e-7 * days) * rad;
      const declination = Math.asin(Math.sin(tilt) * Math.sin(longitude));
      const rightAscension = Math.atan2(Math.cos(tilt) * Math.sin(longitude), Math.cos(longitude));
      const sidereal = (280.46062 + 360.98564737 * days - 20) * rad; // 20° west
      const latitude = 40 * rad;
      const cosZenith =
        Math.sin(latitude) * Math.sin(declination) +
        Math.cos(latitude) * Math.cos(declination) * Math.cos(sidereal - rightAscension);
      const sun = sunAt(new Date(date), { latitudeDeg: 40, longitudeDeg: -20, altitudeM: 0 });
      expectAbsolute(sun.trueZenithDeg, Math.acos(cosZenith) / rad, 0.02); // theirs, and parallax of 0.0024°
      const distance = 1.00014 - 0.01671 * Math.cos(g) - 0.00014 * Math.cos(2 * g);
      expectAbsolute(sun.distanceAu, distance, 2e-4);
    }
  });

  it("is not refracted: at the refracted sunset it is below the horizon", () => {
    // equator at the equinox: the centre crosses the true horizon within minutes of 18 h local solar time
    const place = { latitudeDeg: 0, longitudeDeg: 0, altitudeM: 0 };
    const zenith = (clock: string): number =>
      sunAt(new Date(`2026-03-20T${clock}Z`), place).trueZenithDeg;
    // 15° an hour: from 18:10 to 18:20 it sinks 2.5° without a change of rate, which refraction would make
    expectAbsolute(zenith("18:20:00") - zenith("18:10:00"), 2.5, 0.01);
    expect(zenith("18:10:00")).toBeGreaterThan(90);
  });
});

describe("the way of the light", () => {
  const station = { latitudeDeg: 38, ozoneHeightM: 22000, altitudeM: 1620, co2Ppm: 425 } as Station;
  const weather = { pressurePa: 83400, temperatureK: 285, relativeHumidity: 0.4 };

  it("gives each constituent its own air mass, aerosol by the apparent angle", () => {
    const masses = airMasses(85, stationPath(weather, station));
    const cos = (degrees: number): number => Math.cos((degrees * Math.PI) / 180);
    // Kasten & Young's table at 5° apparent gives 10.316; 4.87° apparent for true 5° through thinner air: between 10.05 and 10.3
    expect(masses.air).toBeGreaterThan(10.05);
    expect(masses.air).toBeLessThan(10.316);
    // refraction at 5° of true height is 9.6' by common tables at sea level (0.1' printed), less with the pressure
    const apparent = 85 - ((9.6 / 60) * (83400 / 101325) * 283) / 285;
    // Kasten 1965 written out, made for sea level: a ray from 1620 m through the same 2 km differs by 0.3 %
    expectRelative(
      masses.aerosol,
      1 / (cos(apparent) + 0.0548 * (92.65 - apparent) ** -1.452),
      5e-3,
    );
    // a thin shell at 22 km; the layer is 5 km thick: 0.5 % there
    const sine = (6371008.8 + 1620) / (6371008.8 + 22000);
    const shell = 1 / Math.sqrt(1 - (sine * Math.sin((85 * Math.PI) / 180)) ** 2);
    expectRelative(masses.ozone, shell, 8e-3);
    expect(masses.ozone).toBeGreaterThan(shell);
  });

  it("follows the weather of the day as if a path were prepared for each reading", () => {
    const day = [
      weather,
      { ...weather, temperatureK: 291.5 },
      { ...weather, pressurePa: 83_150, temperatureK: 296 },
    ];
    const paths = dayPaths(day, station);
    const noon = airMasses(84, pathInWeather(day[2]!, paths));
    // the vapour of the middle reading, not of this one: 5e-5
    const exact = airMasses(84, stationPath(day[2]!, station));
    for (const key of ["air", "ozone", "aerosol"] as const) {
      expectRelative(noon[key], exact[key], 1e-4);
    }
  });

  it("serves a day without change", () => {
    const paths = dayPaths([weather, weather], station);
    const still = airMasses(80, pathInWeather(weather, paths));
    expectRelative(still.air, airMasses(80, stationPath(weather, station)).air, 1e-8);
  });

  it("takes off what a band of 5 nm at 368 nm lets through, its bend included", () => {
    const full = { ...station, ozoneDu: 312, ozoneTemperatureK: 225, nitrogenDioxideDu: 0 };
    const channel = { name: "a", centreNm: 368, fullWidthHalfMaximumNm: 5 };
    const optics = channelOptics(channel, { ...full, co2Ppm: 425 } as Station);
    const slant = (mass: number): number =>
      knownTerms(optics, { air: mass, ozone: mass, aerosol: mass }, 1.8e29, NO_AEROSOL).reduce(
        (sum, term) => sum + term.opticalDepth * term.airMass,
        0,
      );
    for (const mass of [1, 8]) {
      // the same by a plain sum over a finer grid; ozone at 368 nm is left out: 6e-5 of depth
      let [through, all] = [0, 0];
      for (let nm = 360; nm <= 376; nm += 0.01) {
        const light = solarIrradiance(nm) * 2 ** -(((2 * (nm - 368)) / 5) ** 2);
        through += light * Math.exp(-rayleighCrossSection(nm, 425) * 1.8e29 * mass);
        all += light;
      }
      expectAbsolute(slant(mass), -Math.log(through / all), 1e-4 * mass);
    }
    expect(8 * slant(1) - slant(8)).toBeGreaterThan(2e-3); // the bend: 0.3 %
  });
});

describe("small parts", () => {
  it("marks a bump on a sloping day and no more", () => {
    const gauss = normal(seeded(4));
    const hours = Array.from({ length: 200 }, (_, i) => 8 + i / 30);
    const depths = hours.map((hour) => 0.05 + 0.01 * (hour - 8) + 3e-4 * gauss());
    for (let i = 80; i < 100; i++) depths[i]! += 0.3 * Math.sin(((i - 79) / 21) * Math.PI);
    depths[150] = Number.NaN;
    const marks = markClouds(hours, depths);
    const marked = marks.flatMap((mark, i) => (mark ? [i] : []));
    expect(marked).toEqual([...Array.from({ length: 20 }, (_, i) => 80 + i), 150]);
    expect(markClouds([8], [0.1])).toEqual([false]);
    expect(markClouds([8], [Number.NaN])).toEqual([true]);
  });

  it("guesses the water above from the vapour at the ground", () => {
    // saturated vapour at 20 °C weighs 17.3 g per m³ (three printed digits, common tables): times 2 km, 3.46 cm
    const water = precipitableWaterCm({
      pressurePa: 101325,
      temperatureK: 293.15,
      relativeHumidity: 1,
    });
    expectRelative(water, 3.46, 0.006); // half a digit of 17.3, and the enhancement factor of 1.004
  });

  it("moves labels apart and keeps their order", () => {
    const moved = spreadApart([0.5, 0.1, 0.11, 0.12], 0.05);
    const sorted = [...moved].sort((a, b) => a - b);
    for (let i = 1; i < 4; i++) expect(sorted[i]! - sorted[i - 1]!).toBeGreaterThan(0.0499);
    expect(moved[0]).toBe(0.5);
    expect(moved[1]! < moved[2]! && moved[2]! < moved[3]!).toBe(true);
  });

  it("writes tables for the terminal and for the page", () => {
    const table = {
      title: "T <&>",
      columns: [
        ["a", "nm"],
        ["bb", ""],
      ] as const,
      rows: [
        ["1", "#ffaa00"],
        ["222", "x"],
      ],
    };
    expect(tableAsText(table)).toBe(
      ["T <&>", "  a       bb", " nm", "---  -------", "  1  #ffaa00", "222        x"].join("\n"),
    );
    const html = tableAsHtml(table);
    expect(html).toContain("T &lt;&amp;&gt;");
    expect(html).toContain('<i class="patch" style="background:#ffaa00"></i>#ffaa00');
    expect(html.match(/<tr>/g)).toHaveLength(3);
  });
});
