/** Physical constants: CODATA 2018/2022 (the exact ones are the same in both) and IAU resolutions. @module constants */

/** Speed of light in vacuum, m s⁻¹, exact (SI 2019). */
export const SPEED_OF_LIGHT = 299792458;
/** Planck constant, J s, exact (SI 2019). */
export const PLANCK_CONSTANT = 6.62607015e-34;
/** Boltzmann constant, J K⁻¹, exact (SI 2019). */
export const BOLTZMANN_CONSTANT = 1.380649e-23;
/** Avogadro constant, mol⁻¹, exact (SI 2019). */
export const AVOGADRO_CONSTANT = 6.02214076e23;
/** Molar gas constant, J mol⁻¹ K⁻¹: Boltzmann constant times Avogadro constant, exact. */
export const MOLAR_GAS_CONSTANT = 8.31446261815324;
/** Second radiation constant h c / k, m K, derived from exact constants, rounded to double precision. */
export const SECOND_RADIATION_CONSTANT = 0.014387768775039337;
/** First radiation constant for radiance 2 h c², W m² sr⁻¹, derived from exact constants. */
export const FIRST_RADIATION_CONSTANT_RADIANCE = 1.1910429723971884e-16;
/** Molecules per m² in one Dobson unit: 0.01 mm of ideal gas at 273.15 K and 101 325 Pa, derived, exact to the printed digits. */
export const MOLECULES_PER_DOBSON_UNIT = 2.686780111798444e20;
/** Standard atmosphere, Pa, exact. */
export const STANDARD_ATMOSPHERE = 101325;
/** Astronomical unit, m, exact (IAU 2012 resolution B2). */
export const ASTRONOMICAL_UNIT = 149597870700;
/** Nominal total solar irradiance at 1 au, W m⁻² (IAU 2015 resolution B3, from memory). */
export const TOTAL_SOLAR_IRRADIANCE = 1361;
/** Luminous efficacy at the peak of the 2° observer's y, lm W⁻¹ (CIE 018, from memory); 683 is its value at 540 THz, 555.016 nm in standard air. */
export const PEAK_LUMINOUS_EFFICACY = 683.002;
/** Mean radius of the Earth (2a + b)/3, m (IUGG, WGS 84). */
export const MEAN_EARTH_RADIUS = 6371008.8;
