"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.FREQUENCIES = exports.RING_DRIVE_LEVEL = exports.RING_DRIVE = exports.LEVELS = void 0;
/**
 * The nine columns of the level diagram, in signal order. An invented transmitter: gains are such as single bipolar and
 * field-effect stages give (common practice); a diode-ring mixer loses 6 to 7 dB (common practice); five watts are
 * 10 lg(5 W / 1 mW) = 36.99 dBm.
 */
exports.LEVELS = {
    modulator: {
        ...{ testPoint: 'TP4', name: 'Balanced modulator', plannedDbm: -18, toleranceDb: 2 },
        limitDbm: -10,
    },
    filter: { testPoint: 'TP5', name: 'Crystal filter', plannedDbm: -24, toleranceDb: 2, limitDbm: -14 },
    ifAmplifier: { testPoint: 'TP6', name: 'IF amplifier', plannedDbm: -10, toleranceDb: 1.5, limitDbm: 8 },
    mixer: { testPoint: 'TP8A', name: 'Mixer', plannedDbm: -16.5, toleranceDb: 2, limitDbm: -6 },
    bandPass: { testPoint: 'TP8', name: 'Band-pass filter', plannedDbm: -19, toleranceDb: 1.5 },
    preDriver: { testPoint: 'TP9', name: 'Pre-driver', plannedDbm: 1.5, toleranceDb: 1.5, limitDbm: 10 },
    driver: { testPoint: 'TP10', name: 'Driver', plannedDbm: 20.5, toleranceDb: 1.5, limitDbm: 25 },
    amplifier: { testPoint: 'TP11A', name: 'Power amplifier', plannedDbm: 37.5, toleranceDb: 1, limitDbm: 39 },
    lowPass: { testPoint: 'TP11', name: 'Low-pass filter', plannedDbm: 37, toleranceDb: 1, limitDbm: 43 },
};
/** Drive that both diode rings are made for, dBm: +7 is the common rating (common practice). */
exports.RING_DRIVE = [7, 1];
/** The same as a level, for the stage that is fed with it. */
exports.RING_DRIVE_LEVEL = { plannedDbm: exports.RING_DRIVE[0], toleranceDb: exports.RING_DRIVE[1] };
/**
 * Frequencies in hertz. The filter passes 8.8658 to 8.8682 MHz, so its middle is the 8.867 MHz of the plan; the carrier
 * stands 300 Hz above its upper edge, so the lower sideband goes through (300 Hz: common practice). The local oscillator
 * is above: 23.067 − 8.867 = 14.2 MHz, which turns the sideband over, and 22.8685 − 8.8685 = 14.0 MHz is the band's edge.
 */
exports.FREQUENCIES = {
    carrier: [8_868_400, 8_868_600],
    filterLowEdge: [8_865_600, 8_866_000],
    filterHighEdge: [8_868_100, 8_868_300],
    oscillatorLowEnd: [22_868_500, 22_873_500],
    oscillatorHighEnd: [23_208_500, 23_218_500],
};
//# sourceMappingURL=levels.js.map