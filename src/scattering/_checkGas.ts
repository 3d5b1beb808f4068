/** The one guard of the small scattering functions, lean so that a bundle of one of them stays under a kilobyte. */
import { refuse } from "../_refuse.js";

/** Throws unless the wavelength is 230 to 1690 nm and CO2 0 to 2000 ppm. */
export function checkGas(wavelengthNm: unknown, co2Ppm: unknown, functionName: string): void {
  if (!(typeof wavelengthNm === "number" && wavelengthNm >= 230 && wavelengthNm <= 1690)) {
    const slip =
      (wavelengthNm as number) >= 0.23 && (wavelengthNm as number) <= 1.69
        ? "µm? multiply by 1000"
        : "";
    refuse(wavelengthNm, "230 to 1690 nm", slip, "wavelengthNm", functionName);
  }
  if (!(typeof co2Ppm === "number" && co2Ppm >= 0 && co2Ppm <= 2000)) {
    refuse(co2Ppm, "0 to 2000 ppm", "", "co2Ppm", functionName);
  }
}
