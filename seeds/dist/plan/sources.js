"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.localOscillator = exports.micAmplifier = exports.carrierOscillator = exports.supplyRails = void 0;
const checks_1 = require("./checks");
const levels_1 = require("./levels");
/** Stages 1 to 3 and 7: what everything else is fed with. Currents are such as small-signal stages draw (common practice). */
exports.supplyRails = {
    name: 'Supply rails',
    summary: 'Everything runs from 13.8 V; a regulator makes 9 V for the small stages and another 5 V for the rest.',
    cautions: ['hot parts'],
    checks: [
        (0, checks_1.safety)('supply-limit', 'Current limit set to 0.5 A before the first power', 'Set it on the bench supply with its terminals shorted, then connect the board. Mind the polarity.'),
        (0, checks_1.meter)('supply-input', 'Input voltage', 'At the board, with the board connected.', [13.8, 0.3, 'V']),
        (0, checks_1.meter)('supply-nine', 'The 9 V rail', 'With a 470 ohm load on it.', [9, 0.3, 'V']),
        (0, checks_1.meter)('supply-five', 'The 5 V rail', 'With a 470 ohm load on it.', [5, 0.2, 'V']),
        (0, checks_1.tick)('supply-warm', 'Regulators no more than warm', 'After ten minutes, under 60 °C at the tab by the contact thermometer. Too hot to touch is too hot.'),
        (0, checks_1.photo)('supply-photo', 'Photo of the finished board', 'Both sides, so that the polarity marks can be read.'),
    ],
};
exports.carrierOscillator = {
    name: 'Carrier oscillator',
    summary: 'A crystal pulled to 300 Hz above the filter, loud enough for the diode ring.',
    checks: [
        (0, checks_1.meter)('carrier-current', 'Supply current', 'In the 9 V lead.', [11, 3, 'mA']),
        (0, checks_1.frequency)('carrier-frequency', 'Carrier frequency', 'Let it run for five minutes, then trim it to 8.8685 MHz.', [...levels_1.FREQUENCIES.carrier]),
        (0, checks_1.driveLevel)('carrier-level', 'Output level at TP2', 'Across 50 ohm at TP2.', levels_1.RING_DRIVE),
        (0, checks_1.below)('carrier-harmonic', 'Second harmonic, 20 dB down', 'At 17.737 MHz, on one screen with the carrier.', 20),
        (0, checks_1.photo)('carrier-photo', 'Photo of the finished board', 'With the crystal’s can in view.'),
        (0, checks_1.eyes)('carrier-starts', 'Starts every time', 'Switch it off and on five times, a few seconds apart.'),
    ],
};
exports.micAmplifier = {
    name: 'Mic amplifier',
    summary: 'From a few millivolts of speech to what the modulator takes, and no hum on the way.',
    checks: [
        (0, checks_1.meter)('mic-current', 'Supply current', 'In the 9 V lead, no signal.', [3, 0.8, 'mA']),
        (0, checks_1.meter)('mic-output', 'Output at TP3', '5 mV rms at 1 kHz in, gain at its middle mark.', [150, 30, 'mV']),
        (0, checks_1.decibels)('mic-low-end', 'Level at 300 Hz against 1 kHz', 'Same input at 300 Hz; read the change at TP3 in decibels.', { low: -4, high: 0.5 }, checks_1.KINDS.meter),
        (0, checks_1.tick)('mic-quiet', 'No hum or whistle at full gain', 'Listen at TP3 with the input shorted, then open.'),
        (0, checks_1.photo)('mic-photo', 'Photo of the finished board', 'With the screened input lead in view.'),
    ],
};
exports.localOscillator = {
    name: 'Local oscillator',
    summary: 'Tunes 22.87 to 23.22 MHz, so that less 8.87 MHz it covers the whole of 20 metres.',
    checks: [
        (0, checks_1.meter)('lo-current', 'Supply current', 'In the 9 V lead.', [22, 4, 'mA']),
        (0, checks_1.frequency)('lo-low', 'Low end of the dial', 'Fully anticlockwise, never below the band’s edge.', [
            ...levels_1.FREQUENCIES.oscillatorLowEnd,
        ]),
        (0, checks_1.frequency)('lo-high', 'High end of the dial', 'Fully clockwise, never above the band’s edge.', [
            ...levels_1.FREQUENCIES.oscillatorHighEnd,
        ]),
        (0, checks_1.driveLevel)('lo-level', 'Output level at TP7', 'Across 50 ohm at TP7, at the middle of the dial.', levels_1.RING_DRIVE),
        (0, checks_1.below)('lo-harmonic', 'Second harmonic, 25 dB down', 'At 46.1 MHz, on one screen with the carrier.', 25),
        (0, checks_1.tick)('lo-drift', 'Drifts no more than 100 Hz in ten minutes', 'From ten minutes after switching on.'),
        (0, checks_1.photo)('lo-photo', 'Photo of the finished board', 'With the screening can open.'),
    ],
};
//# sourceMappingURL=sources.js.map