import { emptyPlan, formErrors, planOf, timesOf } from './plan-form';

const MENTOR = '0b6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f11';
const form = (change: Partial<ReturnType<typeof emptyPlan>> = {}) => ({
  ...emptyPlan('each week', MENTOR),
  title: 'Winding evenings',
  first: '2026-10-20',
  ...change,
});

describe('the plan as it is typed', () => {
  it('becomes instants of the club’s wall and a rule', () => {
    expect(planOf(form())).toEqual({
      title: 'Winding evenings',
      startsAt: '2026-10-20T18:30:00Z',
      endsAt: '2026-10-20T20:30:00Z',
      repeat: { rule: 'FREQ=WEEKLY;COUNT=6' },
      skip: [],
      instead: [],
      places: 8,
      benchIds: [],
      mentorIds: [MENTOR],
      stageIds: [],
      note: '',
      tellByMail: false,
    });
  });

  it('takes an end that is earlier on the clock for the next day’s', () => {
    expect(timesOf(form({ from: '22:00', to: '1:00' }))?.endsAt).toBe('2026-10-21T00:00:00Z');
  });

  it('leaves the rule out for a single night', () => {
    expect(timesOf(form({ repeats: 'once', nights: 'many' }))).not.toHaveProperty('repeat');
  });

  it.each([
    ['first', ''],
    ['from', '25:00'],
    ['to', 'late'],
    ['nights', '0'],
    ['nights', '61'],
    ['nights', '2.5'],
  ])('is not looked up while %s is “%s”', (name, text) => {
    const typed = form({ [name]: text });
    expect(timesOf(typed)).toBeUndefined();
    expect(formErrors(typed)).toHaveProperty(name);
    expect(planOf(typed)).toBeUndefined();
  });

  it('is looked up without a name, and not sent without one', () => {
    expect(timesOf(form({ title: ' ' }))).toBeDefined();
    expect(formErrors(form({ title: ' ' }))).toEqual({ title: 'Give it a name.' });
    expect(planOf(form({ title: ' ' }))).toBeUndefined();
    expect(planOf(form({ places: '101' }))).toBeUndefined();
  });
});
