import type { TokenName } from '../tokens';
import type { ShapeName } from './shape';

interface StateLook {
  shape: ShapeName;
  words: string;
  colour: TokenName;
}

/** A reading's verdict; the words are those of the trade here, and never "fail". */
export type Verdict = 'pass' | 'too close to call' | 'not yet';

export const VERDICTS: Record<Verdict, StateLook & { short: string; tint: TokenName }> = {
  pass: { shape: 'tick', words: 'Pass', short: 'Pass', colour: 'green', tint: 'greenTint' },
  'too close to call': {
    shape: 'diamond',
    words: 'Too close to call',
    short: 'Too close',
    colour: 'brass',
    tint: 'brassTint',
  },
  'not yet': { shape: 'square', words: 'Not yet', short: 'Not yet', colour: 'oxide', tint: 'oxideTint' },
};

export type StageState =
  'not started' | 'on the bench' | 'with mentor' | 'sent back' | 'signed off' | 'locked';

export const STAGE_STATES: Record<StageState, StateLook> = {
  'signed off': { shape: 'tick', words: 'Signed off', colour: 'green' },
  'with mentor': { shape: 'half', words: 'With mentor', colour: 'trace' },
  'on the bench': { shape: 'flag', words: 'On the bench', colour: 'ink' },
  'sent back': { shape: 'back', words: 'Sent back', colour: 'copper' },
  'not started': { shape: 'ring', words: 'Not started', colour: 'ink3' },
  locked: { shape: 'padlock', words: 'Locked', colour: 'ink3' },
};

export type InstrumentState =
  'ready' | 'collected' | 'calibration due' | 'with care' | 'out of use' | 'clearance needed' | 'needs you';

export const INSTRUMENT_STATES: Record<InstrumentState, StateLook> = {
  ready: { shape: 'tick', words: 'Ready', colour: 'green' },
  collected: { shape: 'half', words: 'Collected', colour: 'trace' },
  'calibration due': { shape: 'diamond', words: 'Calibration due', colour: 'brass' },
  'with care': { shape: 'diamond', words: 'With care', colour: 'brass' },
  'out of use': { shape: 'octagon', words: 'Out of use', colour: 'oxide' },
  'clearance needed': { shape: 'padlock', words: 'Clearance needed', colour: 'ink3' },
  'needs you': { shape: 'pennant', words: 'Needs you', colour: 'copper' },
};
