"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.LARKMOOR_TWENTY = void 0;
const conversion_1 = require("./conversion");
const power_1 = require("./power");
const sideband_1 = require("./sideband");
const sources_1 = require("./sources");
/**
 * The demo club's own transmitter: single sideband and Morse on 20 metres, five watts. Invented for this club; it is no
 * copy of any published design, and its figures are chosen to fit together, not taken from a built example.
 */
exports.LARKMOOR_TWENTY = {
    name: 'Larkmoor Twenty',
    summary: 'A five-watt transmitter for single sideband and Morse on 20 metres, in twelve stages.',
    edition: 1,
    stages: [
        sources_1.supplyRails,
        sources_1.carrierOscillator,
        sources_1.micAmplifier,
        sideband_1.balancedModulator,
        sideband_1.crystalFilter,
        sideband_1.ifAmplifier,
        sources_1.localOscillator,
        conversion_1.mixerAndBandPass,
        conversion_1.preDriver,
        power_1.driver,
        power_1.amplifierAndLowPass,
        power_1.onTheAir,
    ],
};
//# sourceMappingURL=larkmoor-twenty.js.map