/** The public names of every subpath, and for each function or table the bytes it may cost alone in a bundle (minified). `npm run sizes` writes the present ones. */

/** What a subpath exports. */
export interface PublicNames {
  /** Functions, tables and constants with their ceilings in bytes. */
  readonly values: Readonly<Record<string, number>>;
  /** Interfaces and type aliases. */
  readonly types: readonly string[];
}

export const PUBLIC_NAMES: Readonly<Record<string, PublicNames>> = {
  "./spectrum": {
    values: {
      bandMean: 2440,
      gaussianPassband: 6160,
      integrateSpectrum: 2670,
      planckRadiance: 1230,
      resampleSpectrum: 2110,
      solarIrradiance: 3490,
      tabulate: 1220,
      wavelengthGrid: 1430,
    },
    types: ["Passband", "Spectrum"],
  },
  "./air": {
    values: {
      airDensity: 410,
      airNumberDensity: 310,
      airToVacuumWavelength: 1590,
      gravity: 1400,
      groupIndexCiddor: 1480,
      moistAir: 7200,
      refractiveIndexBirchDowns: 1560,
      refractiveIndexCiddor: 1440,
      refractiveIndexEdlen: 1530,
      refractiveIndexPeckReeder: 1160,
      standardAtmosphere: 6820,
      vacuumToAirWavelength: 1480,
    },
    types: ["MoistAir", "MoistAirInput", "StandardState"],
  },
  "./scattering": {
    values: {
      depolarisation: 1320,
      kingFactor: 1290,
      rayleighCrossSection: 1570,
      rayleighPhase: 1220,
      rayleighPolarisation: 1250,
      rayleighScatteringCoefficient: 1900,
    },
    types: [],
  },
  "./absorption": {
    values: {
      mixedGasTransmittance: 7360,
      nitrogenDioxideCrossSection: 2180,
      ozoneCrossSection: 13080,
      waterVapourTransmittance: 7400,
    },
    types: [],
  },
  "./column": {
    values: {
      airColumn: 7940,
      airColumnBodhaine: 1880,
      angstromOpticalDepth: 1550,
      nitrogenDioxideOpticalDepth: 2310,
      ozoneOpticalDepth: 13200,
      rayleighOpticalDepth: 1730,
    },
    types: ["AirColumn", "AirColumnInput", "AngstromAerosol"],
  },
  "./path": {
    values: {
      airMassKastenWater: 1210,
      airMassKastenYoung: 1230,
      airMassShell: 1540,
      airMassYoung: 1220,
      refractionBennett: 1540,
      refractionSaemundsson: 1560,
    },
    types: ["Shell", "SurfaceAir"],
  },
  "./beam": {
    values: {
      beamAt: 8850,
      beamIrradiance: 20120,
      beamOpticalDepths: 17380,
      beamTable: 18420,
      beamTransmittance: 17500,
      beamTransmittances: 20300,
      clearBeam: 9790,
    },
    types: [
      "BandRows",
      "Beam",
      "BeamKernel",
      "BeamMasses",
      "BeamOpticalDepths",
      "BeamState",
      "BeamTable",
      "ClearBeamInput",
    ],
  },
  "./colour": {
    values: {
      chromaticity: 1070,
      cie1931Observer: 13340,
      cie1931Observer5nm: 1860,
      cie1964Observer: 11090,
      correlatedColourTemperature: 20700,
      daylightIlluminant: 3250,
      decodeSrgb: 970,
      encodeSrgb: 1010,
      fitToDisplay: 1260,
      linearSrgbToXyz: 960,
      spectraToXyz: 2590,
      spectrumToXyz: 1110,
      srgbHex: 1670,
      xyzToLinearSrgb: 930,
    },
    types: ["Chromaticity", "ColourTemperature", "Observer", "Rgb", "Xyz"],
  },
  "./retrieval": {
    values: {
      angstromFit: 7490,
      langleyFit: 10150,
      residualOpticalDepth: 2090,
    },
    types: [
      "AngstromResult",
      "Covariance2",
      "KnownTerm",
      "LangleyInput",
      "LangleyResult",
      "RejectedReading",
      "SlantPath",
    ],
  },
};
