/** Unit aliases: every number in a public signature is written as one of these; they add no code. @module units */

/** Vacuum wavelength in nanometres (nm). */
export type Nanometres = number;
/** Pressure in pascals (Pa). */
export type Pascals = number;
/** Thermodynamic temperature in kelvins (K). */
export type Kelvins = number;
/** Angle in degrees. */
export type Degrees = number;
/** Angle in arcseconds. */
export type Arcseconds = number;
/** Length in metres (m); heights are above mean sea level. */
export type Metres = number;
/** A share of one, 0 to 1 (relative humidity, albedo, transmittance). */
export type Fraction = number;
/** Mole fraction in parts per million (µmol/mol). */
export type PartsPerMillion = number;
/** Column of a gas in Dobson units (DU), 2.686780e20 molecules per m². */
export type DobsonUnits = number;
/** Column of water vapour as liquid depth in centimetres (1 cm = 10 kg per m²). */
export type Centimetres = number;
/** Area per molecule in square metres (m²). */
export type SquareMetres = number;
/** A number without unit (refractive index, air mass, optical depth, King factor). */
export type Dimensionless = number;
/** Spectral irradiance in W m⁻² nm⁻¹. */
export type SpectralIrradiance = number;
/** Spectral radiance in W m⁻² sr⁻¹ nm⁻¹. */
export type SpectralRadiance = number;
/** Distance in astronomical units (au). */
export type AstronomicalUnits = number;

/** A quantity that depends on wavelength: give it nanometres, get its value. */
export type QuantityOfWavelength = (wavelengthNm: Nanometres) => number;

/** Pascals in one hectopascal (millibar), exact. */
export const PASCALS_PER_HECTOPASCAL = 100;
/** Kelvins at 0 °C, exact. */
export const KELVINS_AT_ZERO_CELSIUS = 273.15;
/** Radians in one degree, π / 180. */
export const RADIANS_PER_DEGREE = 0.017453292519943295;
/** Degrees in one radian, 180 / π. */
export const DEGREES_PER_RADIAN = 57.29577951308232;
/** Arcseconds in one degree, exact. */
export const ARCSECONDS_PER_DEGREE = 3600;
/** Nanometres in one micrometre, exact. */
export const NANOMETRES_PER_MICROMETRE = 1000;
