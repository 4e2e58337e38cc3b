"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.SCOPE_START = exports.eyes = exports.photo = exports.safety = exports.tick = exports.GAIN_TOLERANCE_DB = exports.KINDS = void 0;
exports.meter = meter;
exports.scopeLevel = scopeLevel;
exports.driveLevel = driveLevel;
exports.analyzerLevel = analyzerLevel;
exports.carried = carried;
exports.gain = gain;
exports.below = below;
exports.frequency = frequency;
exports.decibels = decibels;
exports.loadPower = loadPower;
/** Kinds of instrument the plan asks for; the club's own have the same names. */
exports.KINDS = {
    scope: 'Oscilloscope',
    analyzer: 'Spectrum analyzer',
    meter: 'Multimeter',
    counter: 'Frequency counter',
    load: 'Dummy load and wattmeter',
};
/** Half a decibel wider than the gain's own tolerance would leave no room for the uncertainty of two readings. */
exports.GAIN_TOLERANCE_DB = 1.5;
const tick = (key, title, instruction) => ({
    key,
    kind: 'tick',
    title,
    instruction,
});
exports.tick = tick;
const safety = (key, title, instruction) => ({
    key,
    kind: 'safety',
    title,
    instruction,
});
exports.safety = safety;
const photo = (key, title, instruction) => ({
    key,
    kind: 'photo',
    title,
    instruction,
});
exports.photo = photo;
const eyes = (key, title, instruction) => ({
    key,
    kind: "mentor's eyes",
    title,
    instruction,
});
exports.eyes = eyes;
const measured = (key, title, instruction, measure) => ({ key, kind: 'measure', title, instruction, measure });
/** A current, a voltage or a ratio read from a meter: about its target, by a tolerance in the same unit. */
function meter(key, title, instruction, [target, tolerance, unit]) {
    const window = around(target, tolerance);
    // A hand-held meter within 1 % on these ranges: common practice.
    return measured(key, title, instruction, {
        ...{ method: 'meter', unit, window, target, instrumentKind: exports.KINDS.meter },
        defaults: { accuracyRel: 0.01 },
    });
}
/** A level of the plan, read on the oscilloscope across the load: its window is planned ± tolerance. */
function scopeLevel(key, point, instruction) {
    const { testPoint, plannedDbm, toleranceDb } = point;
    return measured(key, `Output level at ${testPoint}`, instruction, {
        ...{ method: 'oscilloscope', unit: 'dBm', levelPoint: testPoint, target: plannedDbm },
        window: around(plannedDbm, toleranceDb),
        defaults: exports.SCOPE_START,
        instrumentKind: exports.KINDS.scope,
    });
}
/** What the scope's form starts with: the probe at ×10 into 50 ohm, read to a tenth of a division. */
exports.SCOPE_START = { probeRatio: 10, loadOhms: 50, readToDivisions: 0.1 };
/** A level that is no column of the level diagram, such as an oscillator's drive. */
function driveLevel(key, title, instruction, [target, tolerance]) {
    return measured(key, title, instruction, {
        ...{ method: 'oscilloscope', unit: 'dBm', target, window: around(target, tolerance) },
        defaults: exports.SCOPE_START,
        instrumentKind: exports.KINDS.scope,
    });
}
/** A level of the plan where other products stand beside the wanted one, so only the analyzer tells them apart. */
function analyzerLevel(key, point, instruction) {
    const { testPoint, plannedDbm, toleranceDb } = point;
    return measured(key, `Output level at ${testPoint}`, instruction, {
        ...{ method: 'analyzer', unit: 'dBm', levelPoint: testPoint, target: plannedDbm },
        window: around(plannedDbm, toleranceDb),
        defaults: { referenceLevelDbm: 0, dbPerDivision: 10, readToDivisions: 0.02, padsInLineDb: 0 },
        instrumentKind: exports.KINDS.analyzer,
    });
}
/** A level measured at an earlier stage, carried over as what this stage is fed with. */
function carried(key, title, from, { plannedDbm, toleranceDb }) {
    return measured(key, title, 'Carried over from the stage before; measure there again if it has changed.', {
        ...{ method: 'carried', unit: 'dBm', from: [from], target: plannedDbm },
        window: around(plannedDbm, toleranceDb),
    });
}
/** Output less input; a loss is negative. */
function gain(key, title, [output, input], [before, after], window) {
    const target = tenths(after.plannedDbm - before.plannedDbm);
    return measured(key, title, 'Works itself out from the two levels, with both uncertainties.', {
        ...{ method: 'gain', unit: 'dB', from: [output, input], target },
        window: window ?? around(target, exports.GAIN_TOLERANCE_DB),
    });
}
/** Something unwanted, at least so many decibels below the carrier. */
function below(key, title, instruction, decibelsDown) {
    return measured(key, title, instruction, {
        ...{ method: 'harmonic', unit: 'dBc', window: { high: -decibelsDown }, instrumentKind: exports.KINDS.analyzer },
        defaults: { dbPerDivision: 10, readToDivisions: 0.05, scaleFidelityDb: 0.5, flatnessDb: 0.8 },
    });
}
/** A frequency from the counter; the window is in hertz. */
function frequency(key, title, instruction, [low, high]) {
    return measured(key, title, instruction, {
        ...{ method: 'counter', unit: 'Hz', window: { low, high }, target: (low + high) / 2 },
        defaults: { gateSeconds: 1, timeBasePpm: 1 },
        instrumentKind: exports.KINDS.counter,
    });
}
/** A ratio that an instrument shows in decibels; the fixed part is the limit of its difference of two readings. */
function decibels(key, title, instruction, window, instrumentKind) {
    return measured(key, title, instruction, {
        ...{ method: 'meter', unit: 'dB', window, instrumentKind },
        defaults: { readToValue: 0.1, accuracyRel: 0, accuracyFixed: 0.15 },
    });
}
/** Power in the dummy load from the voltage across it. */
function loadPower(key, title, instruction, [low, high, target]) {
    return measured(key, title, instruction, {
        ...{ method: 'dummy-load', unit: 'W', window: { low, high }, target, instrumentKind: exports.KINDS.scope },
        defaults: exports.SCOPE_START,
    });
}
function around(target, tolerance) {
    return { low: tenths(target - tolerance), high: tenths(target + tolerance) };
}
/** Sums of decimals, without the dust of binary fractions. */
function tenths(value) {
    return Number(value.toFixed(6));
}
//# sourceMappingURL=checks.js.map