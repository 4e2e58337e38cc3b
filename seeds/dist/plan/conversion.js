"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.preDriver = exports.mixerAndBandPass = void 0;
const checks_1 = require("./checks");
const levels_1 = require("./levels");
/** Stages 8 and 9: to 14 MHz, and up to a milliwatt and a half. */
exports.mixerAndBandPass = {
    name: 'Mixer and band-pass',
    summary: 'Local oscillator less IF gives 14.2 MHz; the band-pass filter keeps that and little else.',
    levelPoints: [levels_1.LEVELS.mixer, levels_1.LEVELS.bandPass],
    checks: [
        (0, checks_1.carried)('mixer-drive', 'Drive from the local oscillator', 'lo-level', levels_1.RING_DRIVE_LEVEL),
        (0, checks_1.carried)('mixer-input', 'Input level at TP6', 'if-output', levels_1.LEVELS.ifAmplifier),
        (0, checks_1.analyzerLevel)('mixer-output', levels_1.LEVELS.mixer, 'The product at 14.2 MHz alone, with the filter’s input disconnected and the analyzer as the load.'),
        (0, checks_1.gain)('mixer-loss', 'Conversion loss', ['mixer-output', 'mixer-input'], [levels_1.LEVELS.ifAmplifier, levels_1.LEVELS.mixer]),
        (0, checks_1.scopeLevel)('bandpass-output', levels_1.LEVELS.bandPass, 'Filter connected again, 50 ohm at TP8.'),
        (0, checks_1.gain)('bandpass-loss', 'Loss of the band-pass filter', ['bandpass-output', 'mixer-output'], [levels_1.LEVELS.mixer, levels_1.LEVELS.bandPass]),
        (0, checks_1.below)('bandpass-leak', 'Local oscillator, 40 dB down at TP8', 'At 23.1 MHz against 14.2 MHz, one screen.', 40),
        (0, checks_1.photo)('mixer-photo', 'Photo of the finished board', 'With the ring and the filter’s coils in view.'),
    ],
};
exports.preDriver = {
    name: 'Pre-driver',
    summary: 'Twenty decibels into 50 ohm at 14 MHz, still under ten milliwatts.',
    cautions: ['load before power'],
    levelPoints: [levels_1.LEVELS.preDriver],
    checks: [
        (0, checks_1.meter)('predriver-current', 'Supply current', 'In the 13.8 V lead, no signal.', [22, 3, 'mA']),
        (0, checks_1.carried)('predriver-input', 'Input level at TP8', 'bandpass-output', levels_1.LEVELS.bandPass),
        (0, checks_1.photo)('predriver-photo', 'Photo of the finished board', 'Top and underside.'),
        (0, checks_1.scopeLevel)('predriver-output', levels_1.LEVELS.preDriver, 'At 14.1 MHz, 50 ohm fitted at TP9.'),
        (0, checks_1.gain)('predriver-gain', 'Gain at 14.1 MHz', ['predriver-output', 'predriver-input'], [levels_1.LEVELS.bandPass, levels_1.LEVELS.preDriver]),
        (0, checks_1.below)('predriver-harmonic', 'Second harmonic, 25 dB down', 'At 28.2 MHz, on one screen with the carrier.', 25),
        (0, checks_1.safety)('predriver-load', 'The 50 ohm load was at TP9 whenever it was on', 'Without a load the stage can oscillate at full swing and spoil what is connected to it.'),
    ],
};
//# sourceMappingURL=conversion.js.map