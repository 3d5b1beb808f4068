/** Inputs for every public function: what each engine works out and the tests compare. Plain JavaScript: any engine runs it. */

/** `count` values from `from` to `to`, by exact arithmetic alone. */
const spread = (from, to, count) =>
  Array.from({ length: count }, (_, i) => from + ((to - from) * i) / (count - 1));

/** Every pair of two lists, given to `f`. */
const each = (first, second, f) => first.flatMap((a) => second.map((b) => f(a, b)));

/** By name: a function that returns the results on its grid. `a` is the package. */
export function gridOf(a) {
  const nm = spread(301, 1687, 25);
  const visible = spread(300, 655, 25);
  const zenith = spread(0, 89.9, 25);
  const co2 = [300, 425, 1000];
  const states = each([60000, 101325], [250, 288.15, 310], (pressurePa, temperatureK) =>
    a.moistAir({ pressurePa, temperatureK, relativeHumidity: 0.6, co2Ppm: 425 }),
  );
  const sites = [0, 2500].map((altitudeM) => ({
    pressurePa: 101325 - altitudeM * 10,
    altitudeM,
    latitudeDeg: 46,
    co2Ppm: 425,
  }));
  const column = a.airColumn(sites[0]);
  const aerosol = { opticalDepth: 0.12, referenceNm: 500, exponent: 1.3 };
  const air = { ozoneDu: 320, ozoneTemperatureK: 228, ozoneHeightM: 22000, nitrogenDioxideDu: 0.2 };
  const beam = a.clearBeam({ column, trueZenithDeg: 40, ...air, waterCm: 1.5, aerosol });
  const grid = a.wavelengthGrid(380, 780, 5);
  const black = (temperatureK) => a.tabulate((w) => a.planckRadiance(w, temperatureK), grid);
  const temperatures = spread(1200, 20000, 15);
  const xyzs = temperatures.map((t) => {
    const [X, Y, Z] = a.spectrumToXyz(black(t), a.cie1931Observer5nm);
    return [X / Y, 1, Z / Y];
  });
  const rgbs = each(spread(-0.2, 1.3, 9), [0.001, 0.4, 1], (r, b) => [r, 0.5, b]);
  const masses = spread(1.5, 6, 20);
  const wiggle = (i) => 1 + (((i * 7) % 11) - 5) * 1e-4;
  const surface = { pressurePa: 95000, temperatureK: 280 };
  return {
    ...pathGrid(a, zenith),
    ...skyGrid(a),
    ...readingGrid(a, beam),
    ...uncertaintyGrid(a),
    airColumn: () => sites.map(a.airColumn),
    airColumnBodhaine: () => sites.map(a.airColumnBodhaine),
    airDensity: () => states.map(a.airDensity),
    airMassKastenWater: () => zenith.map(a.airMassKastenWater),
    airMassKastenYoung: () => zenith.map(a.airMassKastenYoung),
    airMassShell: () =>
      zenith.map((z) => a.airMassShell(z, { shellHeightM: 22000, altitudeM: 500 })),
    airMassYoung: () => zenith.map(a.airMassYoung),
    airNumberDensity: () => states.map(a.airNumberDensity),
    airToVacuumWavelength: () => each(nm, states, a.airToVacuumWavelength),
    angstromFit: () => [a.angstromFit([440, 500, 675, 870], [0.091, 0.0768, 0.0517, 0.0372])],
    angstromOpticalDepth: () => nm.map((w) => a.angstromOpticalDepth(w, aerosol)),
    bandMean: () => temperatures.map((t) => a.bandMean(black(t), a.gaussianPassband(550, 10))),
    beamAt: () => zenith.map((z) => a.beamAt(beam, z).masses),
    beamIrradiance: () => nm.map((w) => a.beamIrradiance(w, beam, 1.01)),
    beamOpticalDepths: () => nm.map((w) => a.beamOpticalDepths(w, beam)),
    beamTable: () => [a.beamTable(nm, beam)],
    beamTransmittance: () => nm.map((w) => a.beamTransmittance(w, beam)),
    beamTransmittances: () => [a.beamTransmittances(a.beamTable(nm, beam), a.beamAt(beam, 75))],
    chromaticity: () => xyzs.map(a.chromaticity),
    clearBeam: () => [beam],
    // off the locus: on it Duv is the rounding error itself
    correlatedColourTemperature: () =>
      xyzs.map(([X, Y, Z]) => a.correlatedColourTemperature([0.98 * X, Y, Z])),
    daylightIlluminant: () => spread(4000, 25000, 8).map(a.daylightIlluminant),
    decodeSrgb: () => rgbs.map(a.decodeSrgb),
    depolarisation: () => each(nm, co2, a.depolarisation),
    encodeSrgb: () => rgbs.map(a.encodeSrgb),
    fitToDisplay: () => rgbs.map(a.fitToDisplay),
    gaussianPassband: () => [a.gaussianPassband(550, 10)],
    gravity: () => each(spread(-90, 90, 13), [0, 8000], a.gravity),
    groupIndexCiddor: () => each(nm, states, a.groupIndexCiddor),
    integrateSpectrum: () => temperatures.map((t) => a.integrateSpectrum(black(t), 403, 702)),
    kingFactor: () => each(nm, co2, a.kingFactor),
    langleyFit: () => [
      a.langleyFit({
        airMasses: masses,
        signals: masses.map((m, i) => (2 - 0.1 * m) * wiggle(i)),
      }),
    ],
    linearSrgbToXyz: () => rgbs.map(a.linearSrgbToXyz),
    mixedGasTransmittance: () => each(nm, [0.5, 1, 10], a.mixedGasTransmittance),
    moistAir: () => states,
    nitrogenDioxideCrossSection: () => each(visible, [225, 290], a.nitrogenDioxideCrossSection),
    nitrogenDioxideOpticalDepth: () =>
      visible.map((w) => a.nitrogenDioxideOpticalDepth(w, 0.3, 240)),
    ozoneCrossSection: () => each(visible, [205, 228, 290], a.ozoneCrossSection),
    ozoneOpticalDepth: () => visible.map((w) => a.ozoneOpticalDepth(w, 320, 228)),
    planckRadiance: () => each(nm, temperatures, a.planckRadiance),
    rayleighCrossSection: () => each(nm, co2, a.rayleighCrossSection),
    rayleighOpticalDepth: () => nm.map((w) => a.rayleighOpticalDepth(w, column)),
    rayleighPhase: () => each(spread(0, 180, 19), [0, 0.03], a.rayleighPhase),
    rayleighPolarisation: () => each(spread(0, 180, 19), [0, 0.03], a.rayleighPolarisation),
    rayleighScatteringCoefficient: () => each(nm, states, a.rayleighScatteringCoefficient),
    refractionBennett: () => zenith.map((z) => a.refractionBennett(z, surface)),
    refractionSaemundsson: () => zenith.map((z) => a.refractionSaemundsson(z, surface)),
    refractiveIndexBirchDowns: () => each(nm.slice(2), states, a.refractiveIndexBirchDowns),
    refractiveIndexCiddor: () => each(nm, states, a.refractiveIndexCiddor),
    refractiveIndexEdlen: () => each(nm.slice(2), states, a.refractiveIndexEdlen),
    refractiveIndexPeckReeder: () => nm.map(a.refractiveIndexPeckReeder),
    resampleSpectrum: () => [a.resampleSpectrum(black(3000), spread(401, 699, 20))],
    residualOpticalDepth: () =>
      spread(0.2, 1.9, 12).map((signal) =>
        a.residualOpticalDepth(signal, 2, {
          terms: [{ opticalDepth: 0.02, airMass: 1.5 }],
          airMass: 1.6,
        }),
      ),
    solarIrradiance: () => spread(280, 4000, 60).map(a.solarIrradiance),
    spectraToXyz: () => [a.spectraToXyz(black(3000).values, grid, a.cie1931Observer5nm)],
    spectrumToXyz: () => [a.spectrumToXyz(black(3000), a.cie1931Observer)],
    srgbHex: () => [parseInt(a.srgbHex([0.2, 0.4, 0.6]).slice(1), 16)],
    standardAtmosphere: () => spread(-5000, 86000, 40).map(a.standardAtmosphere),
    tabulate: () => [black(5772)],
    vacuumToAirWavelength: () => each(nm, states, a.vacuumToAirWavelength),
    waterVapourTransmittance: () => each(nm, [0.1, 1, 8], a.waterVapourTransmittance),
    wavelengthGrid: () => [grid],
    xyzToLinearSrgb: () => xyzs.map(a.xyzToLinearSrgb),
  };
}

/** Profiles, rays and prepared paths. */
function pathGrid(a, zenith) {
  const station = { pressurePa: 95000, temperatureK: 283.15, relativeHumidity: 0.6 };
  const profile = a.standardProfile({ ...station, altitudeM: 540, co2Ppm: 425 });
  const rows = [113, 480, 1520, 3010].map((heightM, i) => ({
    heightM,
    temperatureK: [279.2, 283.4, 276.9, 268.1][i],
    pressurePa: [100400, 95990, 84600, 70200][i],
    relativeHumidity: 0.5,
  }));
  const smoke = [15000, 18000, 21000].map((heightM, i) => ({ heightM, density: i % 2 }));
  const site = { profile, altitudeM: 540, earthRadiusM: 6371000 };
  const constituents = { ozone: a.gaussianLayer({ heightM: 22000, standardDeviationM: 5000 }) };
  const input = { ...site, wavelengthNm: 550, constituents };
  const path = a.preparePath(input);
  const weather = a.prepareWeatherPaths({
    ...input,
    pressureRangePa: [94000, 96000],
    temperatureRangeK: [275, 290],
  });
  const noon = a.pathInWeather({ pressurePa: 95300, temperatureK: 281 }, weather);
  const star = { ...site, guideWavelengthNm: 500 };
  const high = spread(0, 80, 9);
  return {
    airAtHeight: () => spread(600, 80000, 15).map((h) => a.airAtHeight(h, profile)),
    airMassHardie: () => high.map(a.airMassHardie),
    airMassKasten: () => zenith.map(a.airMassKasten),
    airMassOnPath: () => zenith.map((z) => a.airMassOnPath(z, path)),
    airMassOnTruePath: () => zenith.map((z) => a.airMassOnTruePath(z, path)),
    airMassPickering: () => zenith.map(a.airMassPickering),
    airMassRozenberg: () => zenith.map(a.airMassRozenberg),
    airMassYoungIrvine: () => high.map(a.airMassYoungIrvine),
    airMassesOnPath: () => [a.airMassesOnPath(zenith, path)],
    airMassesOnTruePath: () => [a.airMassesOnTruePath(zenith, path)],
    apparentZenith: () => [10, 60, 90].map((z) => a.apparentZenith(z, input)),
    constituentMassOnPath: () => zenith.map((z) => a.constituentMassOnPath(z, path, "ozone")),
    constituentMassOnTruePath: () =>
      zenith.map((z) => a.constituentMassOnTruePath(z, path, "ozone")),
    constituentMassesOnPath: () => [a.constituentMassesOnPath(zenith, path, "ozone")],
    constituentMassesOnTruePath: () => [a.constituentMassesOnTruePath(zenith, path, "ozone")],
    differentialRefraction: () =>
      each([400, 700], [30, 75], (nm, z) =>
        a.differentialRefraction(nm, { ...star, trueZenithDeg: z }),
      ),
    dispersionOffset: () => [a.dispersionOffset(400, { ...star, trueZenithDeg: 60 }, 30)],
    earthCurvatureRadius: () => each([0, 45, 80], [0, 90, 200], a.earthCurvatureRadius),
    exponentialLayer: () => [a.exponentialLayer({ scaleHeightM: 2000 })],
    gaussianLayer: () => [constituents.ozone],
    pathInWeather: () => zenith.map((z) => a.airMassOnPath(z, noon)),
    preparePath: () => [path.horizonApparentZenithDeg, path.horizonTrueZenithDeg],
    prepareWeatherPaths: () => weather.paths.map((one) => one.horizonTrueZenithDeg),
    refractedPath: () => [0, 45, 85, 89.9].map((z) => a.refractedPath(z, input)),
    refractionOnPath: () => zenith.slice(1).map((z) => a.refractionOnPath(z, path)),
    refractionOnTruePath: () => zenith.slice(1).map((z) => a.refractionOnTruePath(z, path)),
    refractionsOnPath: () => [a.refractionsOnPath(zenith.slice(1), path)],
    refractionsOnTruePath: () => [a.refractionsOnTruePath(zenith.slice(1), path)],
    standardProfile: () => [profile],
    tabulatedLayer: () => [a.tabulatedLayer(smoke)],
    tabulatedProfile: () => [a.tabulatedProfile(rows)],
  };
}

/** The polarised sky. */
function skyGrid(a) {
  const layers = [
    { rayleighDepth: 0.02, absorptionDepth: 0.03 },
    { rayleighDepth: 0.3, absorptionDepth: 0 },
  ];
  const sky = a.prepareSky({ layers, depolarisation: 0.0279, groundAlbedo: 0.2 });
  const lit = a.illuminateSky(sky, 70);
  const views = each([0, 30, 80], [0, 60, 180], (viewZenithDeg, relativeAzimuthDeg) => ({
    viewZenithDeg,
    relativeAzimuthDeg,
    at: "ground",
  }));
  const stokes = views.map((view) => a.skyStokes(lit, view));
  const dusk = a.prepareTwilight({
    ...{ rayleighDepth: 0.2, ozoneDepth: 0.01, depolarisation: 0.0279 },
    ...{ groundAlbedo: 0.1, altitudeM: 0, orders: "single" },
  });
  const zenithView = { viewZenithDeg: 20, relativeAzimuthDeg: 60 };
  return {
    angleOfPolarisation: () => stokes.map(a.angleOfPolarisation),
    degreeOfPolarisation: () => stokes.map(a.degreeOfPolarisation),
    illuminateSky: () => [lit.groundRadiance, lit.diffuseFluxes],
    neutralPoints: () => [a.neutralPoints(lit)],
    prepareSky: () => [sky.sphericalAlbedo],
    prepareTwilight: () => [a.twilightStokes(dusk, { ...zenithView, sunZenithDeg: 91 })],
    rayleighPhaseMode: () => [0, 1, 2].map((mode) => a.rayleighPhaseMode(mode, 0.3, -0.6, 0.03)),
    rayleighScatteringMatrix: () =>
      spread(0, 180, 13).map((t) => a.rayleighScatteringMatrix(t, 0.03)),
    skyFluxes: () => [a.skyFluxes(lit)],
    skyRadiance: () => views.map((view) => a.skyRadiance(lit, view, 1.5)),
    skyStokes: () => stokes,
    skyStokesMap: () => [
      a.skyStokesMap(lit, { viewZenithsDeg: [10, 60], relativeAzimuthsDeg: [0, 90], at: "ground" }),
    ],
    twilightStokes: () =>
      [90, 93, 96].map((sunZenithDeg) => a.twilightStokes(dusk, { ...zenithView, sunZenithDeg })),
  };
}

/** Readings and calibrations. */
function readingGrid(a, beam) {
  const reading = {
    ...{ signal: 1.25, signalStandardUncertainty: 0.001, constant: 2, sunDistanceAu: 1.01 },
    ...{ constantStandardUncertainty: 0.01, airMass: 2, airMassPerDeg: 0.06, terms: [] },
    zenithStandardUncertaintyDeg: 0.005,
  };
  const depths = [reading, { ...reading, constant: 1.8 }].map(a.aerosolOpticalDepth);
  const three = (x) => Float64Array.of(x, 1.1 * x, 1.2 * x);
  const readings = {
    ...{ timesMinutes: Float64Array.of(0, 1, 2), signals: three(1.2), sunDistancesAu: three(0.9) },
    ...{ pressuresPa: three(80000), ozoneDu: three(280), airMasses: three(2) },
    ...{ ozoneAirMasses: three(1.9), aerosolAirMasses: three(2.1) },
  };
  const green = {
    ...{ constant: 2, constantRelativeUncertainty: 0.005, signalRelativeUncertainty: 0.001 },
    ...{ rayleighDepthPerPa: 1.4e-6, ozoneDepthPerDu: 3.2e-5, otherDepth: 0 },
  };
  const series = {
    ...{ pressureRelativeUncertainty: 0.001, ozoneStandardUncertaintyDu: 10 },
    ...{ zenithStandardUncertaintyDeg: 0.005, screeningChannel: 0, windowMinutes: 4 },
  };
  const drift = a.calibrationDrift(
    [0, 100, 200, 300].map((timeDays, i) => ({
      timeDays,
      constant: [2, 1.997, 1.996, 1.993][i],
      standardUncertainty: 0.004,
    })),
  );
  const masses = spread(1.5, 5, 8);
  const flat = { wavelengthsNm: Float64Array.of(400, 600), values: Float64Array.of(1, 1.2) };
  const covariance = Float64Array.of(0.04, 0.01, 0.01, 0.04);
  const pair = [
    [306, 1.6e-23, 0.3],
    [320, 2.4e-24, 0.7],
  ].map(([wavelengthNm, crossSectionM2, signal]) => ({
    ...{ wavelengthNm, crossSectionM2, signal, signalStandardUncertainty: 0.001, constant: 1 },
    ...{ constantStandardUncertainty: 0.002, knownSlantDepth: 0.1 },
  }));
  return {
    aerosolOpticalDepth: () => depths,
    aerosolOpticalDepths: () => [a.aerosolOpticalDepths(readings, [green], series)],
    airMassPerDegree: () => [30, 70].map((z) => a.airMassPerDegree(a.airMassKastenYoung, z)),
    angstromCurvature: () => [
      a.angstromCurvature([412, 500, 675, 862], [0.19, 0.15, 0.1, 0.074], {
        covariance: Array.from({ length: 16 }, (_, i) => (i % 5 === 0 ? 1.6e-5 : 1e-6)),
        referenceNm: 500,
      }),
    ],
    bandTransmittance: () => [
      a.bandTransmittance(a.gaussianPassband(500, 20), flat, (nm) => 0.5 + 0.01 * (nm - 500)),
    ],
    calibrationAt: () => [a.calibrationAt(350, drift)],
    calibrationDrift: () => [drift],
    cloudScreening: () => [
      a.cloudScreening([0, 1, 2, 3, 4, 5], [0.1, 0.1, 0.11, 0.1, 0.2, 0.1], 4),
    ],
    combinedCalibration: () => [
      a.combinedCalibration(
        [2.01, 2, 1.985, 2.004].map((constant) => ({ constant, constantStandardError: 0.002 })),
      ),
    ],
    extinctionFit: () => [
      a.extinctionFit(
        masses.map((airMass, i) => ({
          ...{ band: "V", magnitude: 10.5 + 0.15 * airMass + 0.003 * (i % 3), airMass },
          ...{ standardUncertainty: 0.01, catalogueMagnitude: 8, colourIndex: i % 2 },
        })),
        { secondOrder: false, colourTerm: false },
      ),
    ],
    magnitudeToOpticalDepth: () => [0.1, 1].map(a.magnitudeToOpticalDepth),
    modelExtinction: () => [
      a.modelExtinction({
        passband: a.gaussianPassband(440, 90),
        stars: [12000, 4500].map((t, colourIndex) => ({
          spectrum: a.tabulate((nm) => a.planckRadiance(nm, t), a.wavelengthGrid(200, 700, 5)),
          colourIndex,
        })),
        airMasses: [1, 1.5, 2],
        opticalDepth: (nm) => 0.1 * (550 / nm) * (550 / nm),
      }),
    ],
    opticalDepthCovariance: () => [a.opticalDepthCovariance(depths, ["zenith angle"])],
    opticalDepthCriterion: () => [1, 2, 6].map((m) => a.opticalDepthCriterion(m)),
    opticalDepthToMagnitude: () => [0.1, 1].map(a.opticalDepthToMagnitude),
    ozoneColumn: () => [
      a.ozoneColumn(pair, {
        ...{ sunDistanceAu: 1, ozoneAirMass: 2, ozoneAirMassRelativeUncertainty: 0.001 },
        ...{ aerosolAirMass: 2, aerosolPowers: [0], knownRelativeUncertainty: 0.001 },
        crossSectionRelativeUncertainty: 0.01,
      }),
    ],
    precipitableWater: () => [
      a.precipitableWater({
        ...{ signal: 0.5, signalStandardUncertainty: 0.0005, constant: 1, sunDistanceAu: 1 },
        ...{ constantStandardUncertainty: 0.01, airMass: 2, knownSlantDepth: 0.1 },
        ...{ knownSlantStandardUncertainty: 0.01, bandFactor: 0.55, bandExponent: 0.6 },
        ...{ bandFactorStandardUncertainty: 0.01, bandExponentStandardUncertainty: 0.01 },
      }),
    ],
    reducedSignals: () => [
      a.reducedSignals(masses, {
        sunDistanceAu: 1.01,
        terms: [{ opticalDepth: 0.1, airMasses: masses }],
      }),
    ],
    removeAtmosphere: () => [
      a.removeAtmosphere(
        { wavelengthsNm: Float64Array.of(400, 500), values: Float64Array.of(0.75, 1.18) },
        beam,
        {
          standardUncertainties: [0.01, 0.01],
          leastTransmittance: 0.01,
          slantDepthUncertainties: [(nm) => (0.01 * 500) / nm],
        },
      ),
    ],
    resampleWithCovariance: () => [a.resampleWithCovariance({ ...flat, covariance }, [450, 475])],
    transferredCalibration: () => [
      a.transferredCalibration({
        signals: masses.map((m) => 3 - 0.2 * m),
        referenceSignals: masses.map((m, i) => (2 - 0.13 * m) * (i % 2 ? 1.001 : 1)),
        airMasses: masses,
        referenceConstant: 2,
        referenceStandardUncertainty: 0.01,
      }),
    ],
    zenithStandardUncertainty: () => [
      a.zenithStandardUncertainty({
        ...{ latitudeDeg: 40, sunAzimuthDeg: 100, timeStandardUncertaintyS: 2 },
        latitudeStandardUncertaintyDeg: 0.001,
        longitudeStandardUncertaintyDeg: 0.001,
      }),
    ],
  };
}

/** Propagation of uncertainty. */
function uncertaintyGrid(a) {
  const inputs = {
    x: { value: 3, standardUncertainty: 0.1 },
    y: { value: 4, standardUncertainty: 0.2, degreesOfFreedom: 9 },
  };
  const product = a.propagate(({ x, y }) => x * y, inputs);
  const sum = a.propagate(({ x, y }) => x + y, inputs);
  const random = a.seededRandom(7);
  return {
    coverageFactor: () => each([0.9, 0.99], [5, 16, 1000], a.coverageFactor),
    monteCarlo: () => [a.monteCarlo(({ x, y }) => x * y, inputs, { random: a.seededRandom(3) })],
    propagate: () => [product, sum],
    propagatedCorrelation: () => [a.propagatedCorrelation(sum, product)],
    seededRandom: () => Array.from({ length: 20 }, random),
  };
}

/** The numbers in a result, whatever its shape. */
function numbersIn(value) {
  if (typeof value === "number") return [value];
  if (typeof value !== "object" || value === null) return [];
  return Array.from(ArrayBuffer.isView(value) ? value : Object.values(value)).flatMap(numbersIn);
}

/** By name: every number the functions give, as text that keeps all bits. */
export function resultsOf(a) {
  return Object.fromEntries(
    Object.entries(gridOf(a)).map(([name, results]) => [name, numbersIn(results()).map(String)]),
  );
}
