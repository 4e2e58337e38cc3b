import { describe, expect, it } from 'vitest';
import { problemFrom } from '../../../api-client/problem-error';
import { readRefusal } from './refusal';

const free = { startsAt: '2026-10-17T15:30:00Z', endsAt: '2026-10-17T18:00:00Z' };

describe('a refused booking', () => {
  it('keeps the words for the whole and the free times of a lost race', () => {
    const error = problemFrom(409, {
      type: '/problems/booking-overlap',
      detail: 'Bench 3 went to Lena Quist.',
      nearestFree: [free, 'nonsense', null],
    });
    expect(readRefusal(error, ['b3'])).toMatchObject({
      detail: 'Bench 3 went to Lena Quist.',
      nearestFree: [free],
    });
  });

  it('puts words at the fields and at the instrument they are about, several reasons joined', () => {
    const error = problemFrom(422, {
      detail: 'all of it',
      errors: [
        { pointer: '#/startsAt', detail: 'This time is past.' },
        { pointer: '#/resourceIds/1', detail: 'In repair.' },
        { pointer: '#/resourceIds/1', detail: 'Not cleared.' },
      ],
    });
    expect(readRefusal(error, ['b3', 'i31'])).toEqual({
      detail: undefined,
      fields: { from: 'This time is past.' },
      resources: { i31: 'In repair. Not cleared.' },
      nearestFree: [],
    });
  });

  it('loses no word whose field is not on the form', () => {
    const errors = [{ pointer: '#/elsewhere', detail: 'Strange.' }];
    expect(readRefusal(problemFrom(422, { detail: 'Strange.', errors }), [])?.detail).toBe('Strange.');
  });

  it('is none when there was no answer, or the server failed', () => {
    expect(readRefusal(problemFrom(503, {}), [])).toBeUndefined();
    expect(readRefusal(new Error('x'), [])).toBeUndefined();
  });
});
