/** Cross-sections of ozone and nitrogen dioxide; band models of water vapour and mixed gases. @module absorption */
export { mixedGasTransmittance } from "./mixedGasTransmittance.js";
export { nitrogenDioxideCrossSection } from "./nitrogenDioxideCrossSection.js";
export { ozoneCrossSection } from "./ozoneCrossSection.js";
export { waterVapourTransmittance } from "./waterVapourTransmittance.js";
