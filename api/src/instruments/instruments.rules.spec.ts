import { reasonsAgainst, usableUntil, type UseFacts } from './instruments.rules';

const TODAY = '2026-10-15';

const facts = (overrides: Partial<UseFacts> = {}): UseFacts => ({
  tag: 'FR-031',
  kindName: 'Spectrum analyzer',
  needsClearance: true,
  needsCalibration: true,
  condition: 'ready',
  conditionNote: '',
  calibrationDueOn: '2026-12-09',
  clearance: { until: null },
  ...overrides,
});
const reasons = (overrides: Partial<UseFacts>, lastDay = TODAY) =>
  reasonsAgainst(facts(overrides), { today: TODAY, lastDay });

describe('may somebody use an instrument', () => {
  it('has nothing against a ready, calibrated instrument in cleared hands', () => {
    expect(reasons({})).toEqual([]);
  });

  it('counts the day on which a calibration or clearance ends as its last good day', () => {
    expect(reasons({ calibrationDueOn: TODAY, clearance: { until: TODAY } })).toEqual([]);
  });

  it.each([
    ['in repair', 'FR-031 is in repair: No count under 5 MHz.'],
    ['out of use', 'FR-031 is out of use: No count under 5 MHz.'],
  ] as const)('refuses one that is %s, with what the steward wrote', (condition, reason) => {
    const against = reasons({ condition, conditionNote: 'No count under 5 MHz' });
    const remedy = 'Choose another spectrum analyzer, or ask a steward when it is back.';
    expect(against).toEqual([{ code: condition, reason, remedy }]);
  });

  it('refuses one whose calibration ran out, and one that has none on record', () => {
    expect(reasons({ calibrationDueOn: '2026-10-14' })).toMatchObject([
      { code: 'calibration past', reason: 'The calibration of FR-031 ran out on 14 Oct 2026.' },
    ]);
    expect(reasons({ calibrationDueOn: null })).toMatchObject([{ code: 'calibration unknown' }]);
  });

  it('refuses a day after the calibration ends and names the last good day', () => {
    expect(reasons({}, '2026-12-10')).toMatchObject([
      {
        reason: 'The calibration of FR-031 holds until 9 Dec 2026.',
        remedy: 'Choose a day up to 9 Dec 2026, or another spectrum analyzer.',
      },
    ]);
  });

  it('asks nothing of a kind that needs no calibration and no clearance', () => {
    const plain = { needsCalibration: false, needsClearance: false, calibrationDueOn: null };
    expect(reasons({ ...plain, clearance: undefined })).toEqual([]);
  });

  it('refuses somebody not cleared, and says whom to ask', () => {
    expect(reasons({ clearance: undefined })).toEqual([
      {
        code: 'not cleared',
        reason: 'Clearance needed: you are not cleared on the spectrum analyzer.',
        remedy: 'Ask a steward to clear you on it.',
      },
    ]);
  });

  it('refuses a clearance that ended, and one that ends before the day', () => {
    expect(reasons({ clearance: { until: '2026-10-14' } })).toMatchObject([
      { reason: 'Your clearance on the spectrum analyzer ended on 14 Oct 2026.' },
    ]);
    expect(reasons({ clearance: { until: '2026-10-20' } }, '2026-10-21')).toMatchObject([
      {
        code: 'clearance past',
        reason: 'Your clearance on the spectrum analyzer ends on 20 Oct 2026.',
        remedy: 'Choose a day up to 20 Oct 2026, or ask a steward to renew it.',
      },
    ]);
  });

  it('gives every reason, the gravest first', () => {
    const all = reasons({ condition: 'in repair', calibrationDueOn: '2026-01-01', clearance: undefined });
    expect(all.map(({ code }) => code)).toEqual(['in repair', 'calibration past', 'not cleared']);
  });

  it('keeps the capitals of a kind that is written in capitals', () => {
    const [reason] = reasons({ kindName: 'RF millivoltmeter', clearance: undefined });
    expect(reason?.reason).toContain('on the RF millivoltmeter');
  });

  it('says until when it may be used: the earlier of calibration and clearance, if there is one', () => {
    expect(usableUntil(facts({ clearance: { until: '2026-11-01' } }))).toBe('2026-11-01');
    expect(usableUntil(facts({}))).toBe('2026-12-09');
    expect(usableUntil(facts({ needsCalibration: false }))).toBeUndefined();
  });
});
