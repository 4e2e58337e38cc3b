"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.diceOf = diceOf;
/**
 * A counter stepped by the golden ratio and mixed, seeded by a word: plenty for demo data, not for secrets.
 *
 * @param word - any text; the same word throws the same dice.
 */
function diceOf(word) {
    let state = [...word].reduce((sum, letter) => Math.imul(sum ^ letter.charCodeAt(0), 16_777_619), 2_166_136_261) >>> 0;
    const next = () => {
        state = (state + 0x9e37_79b9) >>> 0;
        let mixed = Math.imul(state ^ (state >>> 16), 0x21f0_aaad);
        mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a_2d97);
        return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32;
    };
    const between = (low, high) => low + (high - low) * next();
    const bell = () => Array.from({ length: 12 }, next).reduce((sum, value) => sum + value, -6);
    const pick = (items) => items[Math.floor(next() * items.length)] ?? items[0];
    return { next, between, bell, pick };
}
//# sourceMappingURL=dice.js.map