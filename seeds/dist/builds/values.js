"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.plausible = plausible;
exports.nextOffset = nextOffset;
/** How far from the target a careful builder comes out, as a share of half the window. */
const SPREAD = 0.22;
/**
 * A value a careful builder would find: near the target, or well inside an open window.
 *
 * @param care - 1 for the first try; smaller comes nearer, for a retake.
 */
function plausible({ windowLow, windowHigh, target }, dice, care) {
    if (windowLow !== null && windowHigh !== null) {
        const middle = target ?? (windowLow + windowHigh) / 2;
        return middle + dice.bell() * SPREAD * care * ((windowHigh - windowLow) / 2);
    }
    if (windowHigh !== null)
        return windowHigh - roomOf(windowHigh) * (1.2 + dice.next());
    if (windowLow !== null)
        return windowLow + roomOf(windowLow) * (1.2 + dice.next());
    return target ?? 0;
}
/** In an open window the room taken is about a sixth of the limit itself. */
const roomOf = (limit) => Math.max(Math.abs(limit) / 6, 0.01);
/**
 * How far the next level of the signal path lies from its plan, dB: a stage with the planned gain hands on the
 * difference it was fed with, less what its builder trimmed away, and adds a little of its own.
 */
function nextOffset(offsetDb, dice, care) {
    return care * (0.7 * offsetDb + 0.14 * dice.bell());
}
//# sourceMappingURL=values.js.map