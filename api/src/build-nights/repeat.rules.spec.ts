import { fallsOn, readRule } from './repeat.rules';

const TUESDAY = 2;
const WEDNESDAY = 3;

const refusalOf = (rule: string): unknown => {
  try {
    return readRule(rule);
  } catch (error) {
    return error;
  }
};

describe('the rule of a series', () => {
  it.each([
    ['FREQ=WEEKLY;COUNT=6', { interval: 1, days: [] }],
    ['FREQ=WEEKLY;BYDAY=TU;COUNT=60', { interval: 1, days: ['TU'] }],
    ['FREQ=WEEKLY;INTERVAL=2;BYDAY=TH,TU;UNTIL=20270331T235959Z', { interval: 2, days: ['TU', 'TH'] }],
    ['COUNT=1;FREQ=WEEKLY', { interval: 1, days: [] }],
  ])('takes %s', (rule, read) => {
    expect(readRule(rule)).toEqual(read);
  });

  it.each([
    ['', 'not a part of a rule'],
    ['weekly', 'not a part of a rule'],
    ['FREQ=WEEKLY;', 'not a part of a rule'],
    ['FREQ=WEEKLY=2;COUNT=6', 'not a part of a rule'],
    ['RRULE:FREQ=WEEKLY;COUNT=6', 'does not know RRULE:FREQ'],
    ['FREQ=MONTHLY;BYDAY=1TU;COUNT=6', 'not FREQ=MONTHLY'],
    ['FREQ=SECONDLY;COUNT=6', 'not FREQ=SECONDLY'],
    ['FREQ=WEEKLY;BYHOUR=19;COUNT=6', 'does not know BYHOUR'],
    ['FREQ=WEEKLY;constructor=1;COUNT=6', 'does not know constructor'],
    ['COUNT=6', 'does not say FREQ=WEEKLY'],
    ['FREQ=WEEKLY', 'either how many nights'],
    ['FREQ=WEEKLY;COUNT=6;UNTIL=20270331T235959Z', 'either how many nights'],
    ['FREQ=WEEKLY;COUNT=6;COUNT=7', 'twice'],
    ['FREQ=WEEKLY;COUNT=0', 'COUNT is a whole number of nights, 1 to 60'],
    ['FREQ=WEEKLY;COUNT=61', 'COUNT is a whole number'],
    ['FREQ=WEEKLY;COUNT=-6', 'COUNT is a whole number'],
    ['FREQ=WEEKLY;COUNT=6.5', 'COUNT is a whole number'],
    ['FREQ=WEEKLY;COUNT=NaN', 'COUNT is a whole number'],
    ['FREQ=WEEKLY;COUNT=1e1', 'COUNT is a whole number'],
    ['FREQ=WEEKLY;INTERVAL=0;COUNT=6', 'INTERVAL is a whole number of weeks apart, 1 to 12'],
    ['FREQ=WEEKLY;INTERVAL=13;COUNT=6', 'INTERVAL is a whole number'],
    ['FREQ=WEEKLY;BYDAY=XX;COUNT=6', 'BYDAY names each day once'],
    ['FREQ=WEEKLY;BYDAY=1TU;COUNT=6', 'BYDAY names each day once'],
    ['FREQ=WEEKLY;BYDAY=TU,TU;COUNT=6', 'BYDAY names each day once'],
    ['FREQ=WEEKLY;UNTIL=20270331', 'UNTIL is an instant in UTC'],
    ['FREQ=WEEKLY;UNTIL=20270331T235959', 'UNTIL is an instant in UTC'],
    ['FREQ=WEEKLY;UNTIL=20271331T235959Z', 'UNTIL is an instant in UTC'],
  ])('refuses “%s” with words on the field', (rule, words) => {
    expect(refusalOf(rule)).toMatchObject({
      code: 'invalid-input',
      detail: expect.stringContaining(words) as string,
      extras: { errors: [{ pointer: '#/repeat/rule' }] },
    });
  });

  it('asks for a first night on one of its days', () => {
    expect(fallsOn(readRule('FREQ=WEEKLY;BYDAY=TU;COUNT=6'), TUESDAY)).toBe(true);
    expect(fallsOn(readRule('FREQ=WEEKLY;BYDAY=TU;COUNT=6'), WEDNESDAY)).toBe(false);
    expect(fallsOn(readRule('FREQ=WEEKLY;COUNT=6'), WEDNESDAY)).toBe(true);
  });
});
