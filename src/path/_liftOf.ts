/** Refraction of one wavelength beyond that of another. */
import { checkNumber, checkRecord } from "../_check.js";
import { ARCSECONDS_PER_DEGREE, DEGREES_PER_RADIAN } from "../units.js";
import { apparentOf } from "./_apparentOf.js";
import { checkPathInput } from "./_checkPathInput.js";
import type { DispersionInput } from "./differentialRefraction.js";
import type { RayAir } from "./_rayAir.js";
import { traceRay } from "./_traceRay.js";

/** Refraction at `wavelengthNm` beyond that at the guiding wavelength, arcseconds; errors name the function `name`. */
export function liftOf(wavelengthNm: number, star: DispersionInput, name: string): number {
  checkRecord(star, "star", name);
  checkNumber(star.guideWavelengthNm, 300, 1690, "nm", "guideWavelengthNm", name);
  const { trueZenithDeg, apparentZenithDeg } = star;
  const { profile, altitudeM, earthRadiusM } = star;
  const refraction = (nm: number): number => {
    const air = checkPathInput({ profile, altitudeM, earthRadiusM, wavelengthNm: nm }, name);
    return trueZenithDeg === undefined
      ? refractionSeen(air, apparentZenithDeg, name)
      : refractionOf(air, trueZenithDeg, name);
  };
  if ((trueZenithDeg === undefined) === (apparentZenithDeg === undefined)) {
    throw new TypeError(`${name}: star must hold one of trueZenithDeg and apparentZenithDeg`);
  }
  return (refraction(wavelengthNm) - refraction(star.guideWavelengthNm)) * ARCSECONDS_PER_DEGREE;
}

function refractionSeen(air: RayAir, apparentZenithDeg: number, name: string): number {
  checkNumber(apparentZenithDeg, 0, 120, "degrees", "apparentZenithDeg", name);
  return traceRay(air, apparentZenithDeg, name)[0]! * DEGREES_PER_RADIAN;
}

function refractionOf(air: RayAir, trueZenithDeg: number, name: string): number {
  checkNumber(trueZenithDeg, 0, 130, "degrees", "trueZenithDeg", name);
  return trueZenithDeg - apparentOf(air, trueZenithDeg, name);
}
