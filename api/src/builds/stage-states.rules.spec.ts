import type { KeptStageState } from './build-stage.entity';
import {
  currentOf,
  isInBuildersHands,
  lockOf,
  openedAt,
  signOffWaitOf,
  waitOf,
  type Standing,
} from './stage-states.rules';

const stage = (position: number, state: KeptStageState, needsLicence = false): Standing => ({
  ...{ position, state, needsLicence },
  name: `Stage${position}`,
});

describe('a stage', () => {
  it.each<[KeptStageState, boolean]>([
    ['with mentor', true],
    ['signed off', true],
    ['not started', false],
    ['on the bench', false],
    ['sent back', false],
  ])('after one that is %s is open: %s', (before, isOpen) => {
    expect(lockOf(stage(2, 'not started'), [stage(1, before)], false) === null).toBe(isOpen);
  });

  it('is locked by the first of the stages before it that is not done, and says which', () => {
    const before = [stage(1, 'signed off'), stage(2, 'sent back'), stage(3, 'on the bench')];
    expect(lockOf(stage(4, 'not started'), before, false)).toBe(
      'It opens when stage 2 Stage2 is with a mentor or signed off.',
    );
  });

  it('stays open once it was begun, also when an earlier one is sent back', () => {
    expect(lockOf(stage(2, 'on the bench'), [stage(1, 'sent back')], false)).toBeNull();
  });

  it('but is not sent to a mentor while an earlier one is back', () => {
    expect(waitOf(stage(2, 'on the bench'), [stage(1, 'sent back')], false)).toMatch(/stage 1 Stage1/);
  });

  it('is signed off after those before it', () => {
    expect(signOffWaitOf([stage(1, 'signed off'), stage(2, 'with mentor')])).toBe(
      'Sign off stage 2 Stage2 first.',
    );
    expect(signOffWaitOf([stage(1, 'signed off')])).toBeNull();
  });

  it('on the air waits until all before it are signed off, not only sent, and for a licence', () => {
    const air = stage(2, 'not started', true);
    expect(lockOf(air, [stage(1, 'with mentor')], true)).toBe('It opens when stage 1 Stage1 is signed off.');
    expect(
      lockOf(air, [stage(1, 'signed off'), stage(2, 'with mentor'), stage(3, 'not started')], false),
    ).toBe('It opens when stages 2 and 3 are signed off and an organiser has seen your licence.');
    expect(lockOf(air, [stage(1, 'signed off')], false)).toBe(
      'It opens when an organiser has seen your licence.',
    );
    expect(lockOf(air, [stage(1, 'signed off')], true)).toBeNull();
  });

  it('is in the builder’s hands until it is sent, and again when it is sent back', () => {
    const states: KeptStageState[] = [
      'not started',
      'on the bench',
      'sent back',
      'with mentor',
      'signed off',
    ];
    expect(states.map(isInBuildersHands)).toEqual([true, true, true, false, false]);
  });
});

describe('the moment a stage opened', () => {
  const day = (date: number): Date => new Date(Date.UTC(2026, 0, date));
  const [one, two] = [{ stageId: 'one' }, { stageId: 'two' }];
  const moved = (stageId: string, kind: 'sent' | 'sent back' | 'signed off', date: number) => ({
    ...{ stageId, kind },
    at: day(date),
  });
  const events = [
    moved('one', 'sent', 3),
    moved('two', 'sent', 4),
    moved('one', 'sent back', 5),
    moved('one', 'sent', 6),
    moved('one', 'signed off', 7),
    moved('two', 'signed off', 8),
  ];
  const build = { startedAt: day(1), licenceSeenAt: day(2) };

  it('is when the build was begun, or the last of those before was first sent', () => {
    expect(openedAt({ needsLicence: false }, [], events, build)).toEqual(day(1));
    expect(openedAt({ needsLicence: false }, [one], events, build)).toEqual(day(3));
    expect(openedAt({ needsLicence: false }, [one, two], events, build)).toEqual(day(4));
  });

  it('is, on the air, when the last of them was signed off or the licence was seen', () => {
    expect(openedAt({ needsLicence: true }, [one, two], events, build)).toEqual(day(8));
    const seenLater = { ...build, licenceSeenAt: day(9) };
    expect(openedAt({ needsLicence: true }, [one, two], events, seenLater)).toEqual(day(9));
  });
});

describe('the current stage', () => {
  it('is the first open one that is not settled', () => {
    expect(
      currentOf([stage(1, 'signed off'), stage(2, 'with mentor'), stage(3, 'on the bench')])?.position,
    ).toBe(3);
    expect(currentOf([stage(1, 'sent back'), stage(2, 'on the bench')])?.position).toBe(1);
  });

  it('is the last one sent while nothing else is open, and the last of all when everything is signed off', () => {
    expect(
      currentOf([
        { state: 'with mentor' as const, position: 1 },
        { state: 'locked' as const, position: 2 },
      ])?.position,
    ).toBe(1);
    expect(currentOf([stage(1, 'signed off'), stage(2, 'signed off')])?.position).toBe(2);
    expect(currentOf([])).toBeUndefined();
  });
});
