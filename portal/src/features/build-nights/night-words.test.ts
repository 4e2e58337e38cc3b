import { weekStart } from '../../lib/club-time';
import {
  benchWords,
  byMonth,
  gridDays,
  lineWords,
  placesWords,
  plannedWords,
  ruleOf,
  ruleWords,
  scheduleWords,
  tellWords,
} from './night-words';

describe('a rule in words', () => {
  it.each([
    ['FREQ=WEEKLY;COUNT=22', 'Thursdays'],
    ['FREQ=WEEKLY;INTERVAL=1;COUNT=22', 'Thursdays'],
    ['FREQ=WEEKLY;BYDAY=TH,TU;COUNT=22', 'Tuesdays and Thursdays'],
    ['FREQ=WEEKLY;INTERVAL=2;COUNT=22', 'every second Thursday'],
    ['FREQ=WEEKLY;INTERVAL=3;BYDAY=TU;UNTIL=20270331T235959Z', 'every third Tuesday'],
    ['FREQ=WEEKLY;INTERVAL=12;COUNT=2', 'every 12th Thursday'],
  ])('says %s of a Thursday as “%s”', (rule, words) => {
    expect(ruleWords(rule, '2026-10-15')).toBe(words);
  });

  it('is written from the form', () => {
    expect(ruleOf('each week', 6)).toBe('FREQ=WEEKLY;COUNT=6');
    expect(ruleOf('every second week', 3)).toBe('FREQ=WEEKLY;INTERVAL=2;COUNT=3');
    expect(ruleOf('once', 6)).toBeUndefined();
  });
});

describe('words of the page', () => {
  it.each([
    [[], ''],
    [['Bench 3'], 'Bench 3'],
    [['Bench 2', 'Bench 1'], 'Benches 1 and 2'],
    [['Bench 1', 'Bench 2', 'Bench 3', 'Bench 4'], 'Benches 1 to 4'],
    [['Bench 1', 'Bench 3', 'Bench 4'], 'Benches 1, 3 and 4'],
    [['Bench 10', 'Bench 9', 'Bench 11'], 'Benches 9 to 11'],
    [['Window bench', 'Bench 2'], 'Window bench and Bench 2'],
  ])('calls the benches %j “%s”', (tags, words) => {
    expect(benchWords(tags)).toBe(words);
  });

  it('counts places and who waits', () => {
    expect(placesWords({ coming: 5, places: 8, waiting: 0 })).toBe('5 of 8');
    expect(placesWords({ coming: 8, places: 8, waiting: 2 })).toBe('8 of 8, two waiting');
    expect(lineWords(1)).toBe('first in line');
    expect(lineWords(9)).toBe('number 9 in line');
  });

  it('names the planned dates by their number, day and last date', () => {
    expect(plannedWords(['2026-10-20', '2026-10-27', '2026-11-03'])).toBe('Three Tuesdays, to 3 November');
    expect(plannedWords(['2026-10-20', '2026-10-22'])).toBe('Two nights, to 22 October');
    expect(plannedWords(['2026-10-20'])).toBe('Tue 20 Oct');
    expect(plannedWords([])).toBe('No night');
  });

  it('counts in the button what will be scheduled and what clashes', () => {
    expect(scheduleWords(6, 2)).toBe('Schedule six, two clash');
    expect(scheduleWords(6, 1)).toBe('Schedule six, one clashes');
    expect(scheduleWords(4, 0)).toBe('Schedule four');
    expect(scheduleWords(1, 0)).toBe('Schedule the night');
    expect(scheduleWords(1, 1)).toBe('Schedule the night, it clashes');
  });

  it('says how many are told', () => {
    expect(tellWords(5)).toBe('Tell the five people on those stages by mail');
    expect(tellWords(1)).toBe('Tell the one person on those stages by mail');
    expect(tellWords(0)).toMatch(/nobody is told/);
  });
});

describe('days and months', () => {
  it('groups nights by month and names the year only of another year', () => {
    const groups = byMonth(
      ['2026-10-22', '2026-10-29', '2026-11-05', '2027-01-07'],
      (day) => day,
      '2026-10-15',
    );
    expect(groups.map(({ heading, nights }) => [heading, nights.length])).toEqual([
      ['October', 2],
      ['November', 1],
      ['January 2027', 1],
    ]);
  });

  it.each([
    ['2026-10-01', '2026-09-28', '2026-11-02'],
    ['2027-02-01', '2027-02-01', '2027-03-01'],
    ['2026-08-01', '2026-07-27', '2026-09-07'],
    ['2026-12-01', '2026-11-30', '2027-01-04'],
  ])('the grid of %s runs from Monday %s up to %s', (month, from, to) => {
    expect(gridDays(month, weekStart)).toEqual({ from, to });
  });
});
