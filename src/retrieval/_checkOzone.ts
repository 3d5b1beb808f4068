/** The checks of `ozoneColumn`. */
import { checkList, checkNumber, checkRecord } from "../_check.js";
import { checkPositive, checkUncertainty } from "./_checkPositive.js";
import { checkAirMass } from "./_checkAirMass.js";
import type { OzoneChannel, OzonePath } from "./ozoneColumn.js";

/** Throws unless channels and path are sound and there are more channels than aerosol powers. */
export function checkOzone(channels: readonly OzoneChannel[], path: OzonePath, name: string): void {
  checkRecord(path, "path", name);
  checkList(path.aerosolPowers, 0, "aerosolPowers", name);
  path.aerosolPowers.forEach((power, i) => {
    checkNumber(power, -6, 6, "", `aerosolPowers[${i}]`, name);
  });
  checkList(channels, Math.max(2, path.aerosolPowers.length + 1), "channels", name);
  checkNumber(path.sunDistanceAu, 0.9, 1.1, "au", "sunDistanceAu", name);
  checkAirMass(path.ozoneAirMass, "ozoneAirMass", name);
  checkAirMass(path.aerosolAirMass, "aerosolAirMass", name);
  const relative = [
    "ozoneAirMassRelativeUncertainty",
    "knownRelativeUncertainty",
    "crossSectionRelativeUncertainty",
  ] as const;
  for (const field of relative) checkNumber(path[field], 0, 1, "fraction", field, name);
  channels.forEach((channel, i) => {
    checkRecord(channel, `channels[${i}]`, name);
    checkChannel(channel, `channels[${i}]`, name);
  });
}

function checkChannel(channel: OzoneChannel, at: string, name: string): void {
  checkNumber(channel.wavelengthNm, 200, 4000, "nm", `${at}.wavelengthNm`, name);
  checkPositive(channel.signal, `${at}.signal`, name);
  checkPositive(channel.constant, `${at}.constant`, name);
  const [signal, constant] = [
    channel.signalStandardUncertainty,
    channel.constantStandardUncertainty,
  ];
  checkUncertainty(signal, `${at}.signalStandardUncertainty`, name);
  checkUncertainty(constant, `${at}.constantStandardUncertainty`, name);
  checkPositive(signal + constant, `${at}: one standard uncertainty`, name);
  checkNumber(channel.crossSectionM2, 0, 1e-20, "m²", `${at}.crossSectionM2`, name);
  checkNumber(channel.knownSlantDepth, -100, 100, "", `${at}.knownSlantDepth`, name);
}
