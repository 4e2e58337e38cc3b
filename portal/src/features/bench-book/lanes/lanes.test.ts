import { describe, expect, it } from 'vitest';
import type { Booking, Instrument } from '../api/bench-book';
import { blockAt, blocksOf } from './blocks';
import { dragged, moved, type Cursor } from './cursor';
import { extentOf, firstSeen } from './extent';
import { hatchOf } from './hatches';
import { benchLane, instrumentLane, lanesShown } from './lane';
import { daysFrom } from './segments';

const bench = (number: number) =>
  benchLane({ id: `b${number}`, tag: `Bench ${number}`, name: '', position: number });
const instrument = (overrides: Partial<Instrument> = {}): Instrument => ({
  id: 'i31',
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
  myClearance: null,
  mayBook: true,
  reasons: [],
  ...overrides,
});
const booking = (resourceIds: string[], overrides: Partial<Booking> = {}): Booking => ({
  id: 'booking',
  kind: 'session',
  title: '',
  personId: 'p',
  personName: 'Lena Quist',
  mine: false,
  groupId: null,
  groupName: null,
  resources: resourceIds.map((id) => ({ id, kind: 'bench' as const, tag: id, name: '' })),
  startsAt: '2026-10-15T18:00:00Z',
  endsAt: '2026-10-15T21:00:00Z',
  madeAt: '2026-10-12T12:00:00Z',
  checkId: null,
  mayCancel: false,
  ...overrides,
});
const WEEK = daysFrom('2026-10-12', 7);

describe('blocks', () => {
  const lanes = [bench(1), bench(2), bench(3)];

  it('of a session stand one in each lane it holds, and none in the others', () => {
    const blocks = blocksOf([booking(['b1', 'b3'])], lanes, WEEK);
    expect(blocks.map(({ lane, lanes: wide, top }) => [lane, wide, top])).toEqual([
      [0, 1, 1140],
      [2, 1, 1140],
    ]);
  });

  it('of a build night over neighbouring lanes are one, benches and instruments alike', () => {
    const night = booking(['b1', 'b2', 'b3'], { kind: 'build night', title: 'Build night 14' });
    expect(blocksOf([night], lanes, WEEK)).toMatchObject([{ lane: 0, lanes: 3, minutes: 180 }]);
    const withAnalyzer = booking(['b1', 'i31'], { kind: 'build night', title: 'Build night 14' });
    const pair = [bench(1), instrumentLane(instrument())];
    expect(blocksOf([withAnalyzer], pair, WEEK)).toMatchObject([{ lane: 0, lanes: 2 }]);
    const split = booking(['b1', 'b3'], { kind: 'build night', title: 'Build night 14' });
    expect(blocksOf([split], lanes, WEEK)).toHaveLength(2);
  });

  it('are found by lane and minute, their end not included', () => {
    const blocks = blocksOf([booking(['b2'])], lanes, WEEK);
    const at = (lane: number, minute: number) => blockAt(blocks, { date: '2026-10-15', lane, minute });
    expect(at(1, 1140)?.booking.personName).toBe('Lena Quist');
    expect([at(1, 1320), at(0, 1140)]).toEqual([undefined, undefined]);
  });
});

describe('lanes shown', () => {
  const all = [bench(1), bench(2), instrumentLane(instrument({ mayBook: false, tag: 'FR-014' }))];

  it('are those named, at most three, and unknown names are passed over', () => {
    const tags = ['FR-014', 'Bench 9', 'Bench 2'];
    expect(lanesShown(all, tags).map(({ tag }) => tag)).toEqual(['FR-014', 'Bench 2']);
    const many = [1, 2, 3, 4].map(bench);
    expect(
      lanesShown(
        many,
        many.map(({ tag }) => tag),
      ),
    ).toHaveLength(3);
  });

  it('are the first bench and the first instrument one may use, when none is named', () => {
    expect(lanesShown(all, []).map(({ tag }) => tag)).toEqual(['Bench 1']);
    const cleared = [...all, instrumentLane(instrument())];
    expect(lanesShown(cleared, []).map(({ tag }) => tag)).toEqual(['Bench 1', 'FR-031']);
  });
});

describe('the hatch over a day of an instrument', () => {
  const hatch = (overrides: Partial<Instrument>, date: string) =>
    hatchOf(instrument(overrides), date, '2026-10-15');

  it('stands while it is in repair, from today on', () => {
    expect(hatch({ condition: 'in repair' }, '2026-10-15')).toBe('In repair');
    expect(hatch({ condition: 'in repair' }, '2026-10-14')).toBeUndefined();
  });

  it('stands after the last day of its calibration', () => {
    const due = { calibrationDueOn: '2026-10-16' };
    expect(hatch(due, '2026-10-16')).toBeUndefined();
    expect(hatch(due, '2026-10-17')).toBe('Calibration ended 16 Oct 2026');
    expect(hatchOf(undefined, '2026-10-17', '2026-10-15')).toBeUndefined();
  });
});

describe('the hours a week is drawn with', () => {
  const open = (weekday: number, opens: number, closes: number) => ({
    weekday,
    opensMinute: opens * 60,
    closesMinute: closes * 60,
  });
  const HOURS = [open(4, 12, 22), open(6, 10, 20)];
  const drawn = (standing: { from: number; to: number }[], hours = HOURS) => {
    const { from, to } = extentOf(WEEK, hours, standing);
    return [from / 60, to / 60];
  };

  it('go from the earliest opening to the latest closing', () => {
    expect(drawn([])).toEqual([10, 22]);
    expect(extentOf(['2026-10-15'], HOURS, [])).toEqual({ from: 720, to: 1320 });
  });

  it('grow by whole hours to what stands outside', () => {
    expect(drawn([{ from: 9 * 60 + 30, to: 22 * 60 + 15 }])).toEqual([9, 23]);
  });

  it('are the whole day when no hours are given', () => {
    expect(drawn([], [])).toEqual([0, 24]);
  });

  it('open at noon, or earlier when something stands before it', () => {
    const whole = { from: 0, to: 1440 };
    expect(firstSeen(whole, [])).toBe(720);
    expect(firstSeen(whole, [{ from: 570, to: 600 }])).toBe(540);
    expect(firstSeen(whole, [{ from: 30, to: 60 }])).toBe(360);
    expect(firstSeen({ from: 840, to: 1320 }, [])).toBe(840);
  });
});

describe('keys in the lanes', () => {
  const at = { column: 4, slot: 28, length: 3 };
  const DAY = { from: 0, to: 1440 };
  const from = (start: Cursor, key: string, { isShift = false, extent = DAY } = {}) =>
    moved(start, { key, isShift }, 14, extent);
  const press = (key: string, isShift = false) => from(at, key, { isShift });

  it('move by half an hour and lane by lane, and let go of the stretch', () => {
    expect(press('ArrowDown')).toEqual({ column: 4, slot: 29, length: 1 });
    expect(press('ArrowUp')).toEqual({ column: 4, slot: 27, length: 1 });
    expect(press('ArrowRight')).toEqual({ column: 5, slot: 28, length: 1 });
    expect(press('ArrowLeft')).toEqual({ column: 3, slot: 28, length: 1 });
  });

  it('stretch with Shift, down to one half hour and up to midnight', () => {
    expect(press('ArrowDown', true)).toMatchObject({ slot: 28, length: 4 });
    expect(press('ArrowUp', true)).toMatchObject({ slot: 28, length: 2 });
    expect(from({ ...at, length: 1 }, 'ArrowUp', { isShift: true })).toMatchObject({ length: 1 });
    expect(from({ ...at, slot: 47, length: 1 }, 'ArrowDown', { isShift: true })).toMatchObject({ length: 1 });
  });

  it('stay inside the week and the day', () => {
    expect(from({ column: 13, slot: 47, length: 1 }, 'ArrowRight')).toMatchObject({ column: 13 });
    expect(from({ column: 0, slot: 0, length: 1 }, 'ArrowUp')).toMatchObject({ slot: 0 });
  });

  it('stay inside the hours that are drawn', () => {
    const extent = { from: 720, to: 1320 };
    expect(from({ column: 0, slot: 24, length: 1 }, 'ArrowUp', { extent })).toMatchObject({ slot: 24 });
    expect(from({ column: 0, slot: 42, length: 1 }, 'PageDown', { extent })).toMatchObject({ slot: 43 });
    const stretched = from({ column: 0, slot: 43, length: 1 }, 'ArrowDown', { isShift: true, extent });
    expect(stretched).toMatchObject({ slot: 43, length: 1 });
  });

  it('that mean nothing here are left to the page', () => {
    expect(press('x')).toBeUndefined();
  });
});

describe('a drag', () => {
  it('snaps to quarter hours, both ways, and is never shorter than half an hour', () => {
    expect(dragged(842, 986)).toEqual({ from: 840, to: 990 });
    expect(dragged(986, 842)).toEqual({ from: 840, to: 990 });
    expect(dragged(842, 843)).toEqual({ from: 840, to: 870 });
    expect(dragged(1438, 1439)).toEqual({ from: 1425, to: 1440 });
  });
});
