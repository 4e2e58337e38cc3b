"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.PROGRESS = void 0;
const LOCK_WANDERS = 'The lock is not steady when the bench is tapped. Look at the coil’s foot, then count it again.';
const TAPPED = 'It jumps when the screen is tapped. Solder the coil’s foot again and count it once more.';
/** A build at every stage, in the order in which they were begun: Tamsin's is serial 07. */
exports.PROGRESS = [
    { who: 'idris', signedOff: 12 },
    { who: 'marek', signedOff: 9, withMentor: 1, onTheBench: 2 },
    { who: 'priya', signedOff: 9, onTheBench: 1 },
    { who: 'mairi', signedOff: 6, withMentor: 1, sentBack: LOCK_WANDERS },
    { who: 'jonty', signedOff: 4, onTheBench: 2, nightsOnIt: 3 },
    { who: 'lena', signedOff: 8 },
    { who: 'tamsin', signedOff: 7, withMentor: 1, onTheBench: 3 },
    { who: 'noor', signedOff: 5, withMentor: 1 },
    { who: 'bea', signedOff: 6, withMentor: 1, sentBack: TAPPED, isSentAgain: true },
    { who: 'tobias', signedOff: 0, withMentor: 1 },
    { who: 'kofi', signedOff: 2, onTheBench: 1 },
    { who: 'rhoda', signedOff: 1, onTheBench: 2 },
    { who: 'ansel', signedOff: 3, onTheBench: 1 },
    { who: 'yusra', signedOff: 0, onTheBench: 1 },
    { who: 'sunniva', signedOff: 0 },
];
//# sourceMappingURL=progress.js.map