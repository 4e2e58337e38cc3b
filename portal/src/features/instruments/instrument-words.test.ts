import { describe, expect, it } from 'vitest';
import type { Instrument } from './api/instruments';
import { damageWords } from '../../lib/text';
import { calibrationState, changeWords, clearanceWords, stateOf } from './instrument-words';

const TODAY = '2026-10-15';
const instrument = (overrides: Partial<Instrument> = {}): Instrument => ({
  id: 'i',
  tag: 'FR-031',
  name: 'Spectrum analyzer',
  position: 1,
  kind: { id: 'k', name: 'Spectrum analyzer', needsClearance: true, needsCalibration: true },
  condition: 'ready',
  conditionNote: '',
  calibrationDueOn: '2026-12-09',
  damageLevelDbm: 20,
  amplitudeAccuracyDb: 0.8,
  figures: { amplitudeAccuracyDb: 0.8 },
  myClearance: { grantedOn: '2026-01-01', until: '2027-01-01' },
  mayBook: true,
  reasons: [],
  ...overrides,
});
const notCleared = { code: 'not cleared' as const, reason: '', remedy: '' };

describe('an instrument’s state', () => {
  const state = (overrides: Partial<Instrument>) => stateOf(instrument(overrides), TODAY);

  it('names the gravest thing: repair, then calibration past, then clearance, then due soon, then a note', () => {
    const worst = { condition: 'in repair' as const, calibrationDueOn: '2026-01-01', reasons: [notCleared] };
    expect(state(worst)).toEqual({ state: 'out of use', words: 'In repair' });
    expect(state({ ...worst, condition: 'ready' })).toMatchObject({ words: 'Calibration past' });
    expect(state({ reasons: [notCleared], calibrationDueOn: '2026-10-20' }).state).toBe('clearance needed');
    expect(state({ calibrationDueOn: '2026-10-20' })).toMatchObject({ words: 'Calibration due in 5 days' });
    expect(state({ conditionNote: 'Knob is loose' }).state).toBe('with care');
    expect(state({})).toEqual({ state: 'ready', words: 'Ready' });
  });

  it('counts the last day of a calibration as good', () => {
    expect(calibrationState(instrument({ calibrationDueOn: TODAY }), TODAY)?.isPast).toBe(false);
    expect(calibrationState(instrument({ calibrationDueOn: '2026-10-14' }), TODAY)?.isPast).toBe(true);
    expect(calibrationState(instrument({ calibrationDueOn: null }), TODAY)?.isPast).toBe(true);
  });

  it('says clearance, level and history in words', () => {
    expect(clearanceWords(instrument())).toBe('Cleared until 1 Jan 2027');
    expect(clearanceWords(instrument({ reasons: [notCleared] }))).toBe('You are not cleared');
    expect([damageWords(20), damageWords(-10), damageWords(null)]).toEqual(['+20 dBm', '−10 dBm', '']);
    // Down, whichever way it would round: never more than it stands.
    expect([damageWords(12.68), damageWords(-9.95)]).toEqual(['+12.6 dBm', '−10 dBm']);
    const change = { id: 'c', changedAt: '', changedBy: 'Oona', note: '', changed: 'calibration' as const };
    expect(changeWords({ ...change, before: null, after: '2027-01-14' })).toBe(
      'Calibration good until 14 Jan 2027, before none',
    );
  });
});
