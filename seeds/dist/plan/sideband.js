"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.ifAmplifier = exports.crystalFilter = exports.balancedModulator = void 0;
const checks_1 = require("./checks");
const levels_1 = require("./levels");
/** Stages 4 to 6: from a carrier and a voice to one sideband at 8.867 MHz. */
exports.balancedModulator = {
    name: 'Balanced modulator',
    summary: 'A diode ring that lets both sidebands through and holds the carrier back.',
    levelPoints: [levels_1.LEVELS.modulator],
    checks: [
        (0, checks_1.carried)('modulator-carrier', 'Carrier drive from stage 2', 'carrier-level', levels_1.RING_DRIVE_LEVEL),
        (0, checks_1.scopeLevel)('modulator-output', levels_1.LEVELS.modulator, '1 kHz at 150 mV in, balance trimmed, 50 ohm at TP4.'),
        (0, checks_1.below)('modulator-carrier-left', 'Carrier left over, 35 dB down', 'One sideband against the carrier between them, 1 kHz apart on the screen.', 35),
        (0, checks_1.photo)('modulator-photo', 'Photo of the finished board', 'With the two transformers in view.'),
        (0, checks_1.eyes)('modulator-holds', 'Balance holds when the board is tapped', 'Tap it with a pencil and watch the carrier.'),
    ],
};
exports.crystalFilter = {
    name: 'Crystal filter',
    summary: 'Four crystals that pass 2.4 kHz and cut the other sideband off.',
    levelPoints: [levels_1.LEVELS.filter],
    checks: [
        (0, checks_1.carried)('filter-input', 'Input level at TP4', 'modulator-output', levels_1.LEVELS.modulator),
        (0, checks_1.scopeLevel)('filter-output', levels_1.LEVELS.filter, 'At the middle of the passband, 50 ohm at TP5.'),
        (0, checks_1.gain)('filter-loss', 'Loss of the filter', ['filter-output', 'filter-input'], [levels_1.LEVELS.modulator, levels_1.LEVELS.filter]),
        (0, checks_1.frequency)('filter-low-edge', 'Lower edge, 6 dB down', 'Tune down from the middle until TP5 has halved.', [
            ...levels_1.FREQUENCIES.filterLowEdge,
        ]),
        (0, checks_1.frequency)('filter-high-edge', 'Upper edge, 6 dB down', 'Tune up from the middle until TP5 has halved.', [
            ...levels_1.FREQUENCIES.filterHighEdge,
        ]),
        (0, checks_1.photo)('filter-photo', 'Photo of the finished board', 'With the crystals’ cans earthed.'),
    ],
};
exports.ifAmplifier = {
    name: 'IF amplifier',
    summary: 'Makes up for the filter and sets the level the mixer is made for.',
    levelPoints: [levels_1.LEVELS.ifAmplifier],
    checks: [
        (0, checks_1.meter)('if-current', 'Supply current', 'In the 9 V lead.', [8, 1, 'mA']),
        (0, checks_1.carried)('if-input', 'Input level at TP5', 'filter-output', levels_1.LEVELS.filter),
        (0, checks_1.scopeLevel)('if-output', levels_1.LEVELS.ifAmplifier, 'At 8.867 MHz, 50 ohm at TP6.'),
        (0, checks_1.gain)('if-gain', 'Gain at 8.867 MHz', ['if-output', 'if-input'], [levels_1.LEVELS.filter, levels_1.LEVELS.ifAmplifier], {
            low: 12.5,
            high: 15.5,
        }),
        (0, checks_1.decibels)('if-tilt', 'Passband tilt', 'Level at the lower edge against the upper, in decibels.', { high: 1 }, checks_1.KINDS.scope),
        (0, checks_1.photo)('if-photo', 'Photos of the finished board', 'Top and underside; one of the trace at TP6.'),
        (0, checks_1.eyes)('if-joints', 'Looked at the joints and screening', 'With a glass, both sides.'),
        (0, checks_1.eyes)('if-stable', 'Stable with input open and shorted', 'No signal at TP6 either way.'),
        (0, checks_1.tick)('if-heard', 'Heard the stage working', 'A tone at the input, a receiver near TP6.'),
    ],
};
//# sourceMappingURL=sideband.js.map