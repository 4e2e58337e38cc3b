"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.found = found;
/** Looks a key up in what was made; a missing one is a slip in the seed itself. */
function found(made, key) {
    const value = made.get(key);
    if (value === undefined)
        throw new Error(`The demo club has no ${key}.`);
    return value;
}
//# sourceMappingURL=stage-set.js.map