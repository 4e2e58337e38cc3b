"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.onTheAir = exports.amplifierAndLowPass = exports.driver = void 0;
const checks_1 = require("./checks");
const levels_1 = require("./levels");
/** Stages 10 to 12: where it can burn, and where it can be heard. */
exports.driver = {
    name: 'Driver',
    summary: 'A tenth of a watt for the power amplifier, from a transistor on a small heatsink.',
    cautions: ['load before power', 'hot parts'],
    levelPoints: [levels_1.LEVELS.driver],
    checks: [
        (0, checks_1.safety)('driver-load', 'Load fitted and heatsink mounted before power', '50 ohm, half a watt or more, at TP10. The heatsink stays hot after switching off.'),
        (0, checks_1.meter)('driver-bias', 'Standing current', 'In the 13.8 V lead, no signal, after two minutes.', [
            70,
            10,
            'mA',
        ]),
        (0, checks_1.carried)('driver-input', 'Input level at TP9', 'predriver-output', levels_1.LEVELS.preDriver),
        (0, checks_1.scopeLevel)('driver-output', levels_1.LEVELS.driver, 'At 14.1 MHz, 50 ohm at TP10.'),
        (0, checks_1.gain)('driver-gain', 'Gain at 14.1 MHz', ['driver-output', 'driver-input'], [levels_1.LEVELS.preDriver, levels_1.LEVELS.driver]),
        (0, checks_1.below)('driver-harmonic', 'Second harmonic, 25 dB down', 'At 28.2 MHz through the 20 dB pad.', 25),
        (0, checks_1.photo)('driver-photo', 'Photo of the finished board', 'With the heatsink on.'),
        (0, checks_1.eyes)('driver-mounting', 'Transistor flat on its heatsink, washer in place', 'Insulation checked with the ohmmeter, unplugged.'),
    ],
};
exports.amplifierAndLowPass = {
    name: 'PA and low-pass',
    summary: 'Five watts into the dummy load, and its harmonics below the limit.',
    cautions: ['rf power', 'load before power', 'hot parts'],
    levelPoints: [levels_1.LEVELS.amplifier, levels_1.LEVELS.lowPass],
    checks: [
        (0, checks_1.safety)('pa-load', 'Dummy load of 10 W or more connected and checked', 'Read 50 ohm at the plug first. Say “power on” to the bench. RF burns are deep; touch nothing while it is keyed.'),
        (0, checks_1.meter)('pa-idle', 'Idle current', 'No drive, after two minutes.', [100, 10, 'mA']),
        (0, checks_1.carried)('pa-input', 'Input level at TP10', 'driver-output', levels_1.LEVELS.driver),
        (0, checks_1.scopeLevel)('pa-output', levels_1.LEVELS.amplifier, 'Filter bypassed, dummy load at TP11A, at most ten seconds keyed.'),
        (0, checks_1.gain)('pa-gain', 'Gain at 14.1 MHz', ['pa-output', 'pa-input'], [levels_1.LEVELS.driver, levels_1.LEVELS.amplifier]),
        (0, checks_1.scopeLevel)('lowpass-output', levels_1.LEVELS.lowPass, 'Filter in line, dummy load at TP11.'),
        (0, checks_1.gain)('lowpass-loss', 'Loss of the low-pass filter', ['lowpass-output', 'pa-output'], [levels_1.LEVELS.amplifier, levels_1.LEVELS.lowPass], 
        // Two scope readings are good to 0.6 dB, so a loss is only asked to be small; a filter cannot amplify.
        { low: -1.5 }),
        // +36 and +38 dBm are 3.98 and 6.31 W; rounded inwards.
        (0, checks_1.loadPower)('pa-power', 'Power in the dummy load', 'Key down, five seconds.', [4, 6.3, 5]),
        (0, checks_1.meter)('pa-current', 'Supply current at full power', 'Key down, five seconds.', [1, 0.25, 'A']),
        // 43 + 10 lg 5 = 49.99 dB: ITU Radio Regulations, Appendix 3, amateur stations under 30 MHz (from memory).
        (0, checks_1.below)('pa-harmonic', 'Second harmonic, 50 dB down', 'At 28.2 MHz through the 30 dB power pad and the 20 dB pad. Local rules may ask for more.', 50),
        (0, checks_1.tick)('pa-heat', 'Heatsink under 60 °C after five minutes', 'Ten seconds keyed in every thirty. Measure beside the transistor; it stays hot for ten minutes after.'),
        (0, checks_1.photo)('pa-photo', 'Photo of the finished board', 'With the heatsink and the filter’s coils in view.'),
    ],
};
exports.onTheAir = {
    name: 'On the air',
    summary: 'Into an aerial for the first time, under a licence that covers it.',
    cautions: ['licence needed', 'rf exposure', 'rf power'],
    checks: [
        (0, checks_1.safety)('air-licence', 'A licence for this band, mode and power is in force', 'Yours, or that of the licensed person who supervises you. An organiser has seen it. Local rules decide.'),
        (0, checks_1.safety)('air-exposure', 'RF exposure worked out for this aerial and place', 'Distance and time for people near the aerial, by your country’s rules, written down and on file.'),
        (0, checks_1.decibels)('air-return-loss', 'Return loss of the aerial', 'At the plug, over 14.0 to 14.35 MHz, worst value. 14 dB is a standing-wave ratio of 1.5.', { low: 14 }, checks_1.KINDS.load),
        (0, checks_1.tick)('air-listen', 'Listened first, and the frequency was clear', 'Then asked whether it is in use.'),
        (0, checks_1.eyes)('air-signal', 'Signal heard clean on the club’s receiver', 'No clicks, no hum, no second signal.'),
        (0, checks_1.tick)('air-logged', 'First contact written in the log', 'Time, frequency, mode and power.'),
    ],
};
//# sourceMappingURL=power.js.map