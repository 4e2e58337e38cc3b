import usTable from '../../reference/bands-us.json';
import { checkEmission, type EmissionInput, type EmissionKind, US_97 } from '../index';

// Rules and sources: api/levels/reference/bands-us.json, each row with its own source.
const fits = (
  kHz: readonly [number, number],
  emission: EmissionKind,
  more: Partial<Pick<EmissionInput, 'licenceClass' | 'region'>> = {},
): boolean => {
  const [lowHertz, highHertz] = [kHz[0] * 1000, kHz[1] * 1000];
  const asked = { ruleSet: US_97, licenceClass: 'extra', day: '2026-12-01', ...more };
  return checkEmission({ ...asked, emission, lowHertz, highHertz }).fits;
};
const rule = (id: string) => usTable.rules.find((row) => row.id === id);

describe('rules of 47 CFR part 97 in words, one by one', () => {
  it('cw: Morse fits in the middle of every segment, phone does not', () => {
    for (const { inputs } of usTable.emission_segments) {
      const [low = NaN, high = NaN] = inputs.kHz;
      const middle = (low + high) / 2;
      expect(fits([middle - 0.1, middle + 0.1], 'CW')).toBe(true);
    }
    expect(fits([7030, 7032.8], 'phone')).toBe(false);
  });

  it('60m-where: between the channels and beside the segment nothing fits', () => {
    expect(rule('60m-where')?.expected.only).toContain('5351.5-5366.5');
    for (const kHz of [5340, 5350, 5368, 5380]) expect(fits([kHz, kHz + 0.2], 'CW')).toBe(false);
    expect(fits([5360, 5362.7], 'phone')).toBe(true);
  });

  it.each([3550, 7100, 21_100])('tech-80-40-15: at %d kHz novice and technician have Morse only', (kHz) => {
    for (const licenceClass of rule('tech-80-40-15')?.inputs.class ?? []) {
      expect(fits([kHz, kHz + 0.2], 'CW', { licenceClass })).toBe(true);
      expect(fits([kHz, kHz + 0.5], 'data', { licenceClass })).toBe(false);
      expect(fits([kHz, kHz + 2.7], 'phone', { licenceClass })).toBe(false);
    }
  });

  it('tech-10-phone: from 28.3 to 28.5 MHz they have phone too, and no data', () => {
    const [low = NaN, high = NaN] = rule('tech-10-phone')?.inputs.kHz ?? [];
    const kHz = (low + high) / 2;
    for (const licenceClass of ['novice', 'technician']) {
      expect(fits([kHz, kHz + 2.7], 'phone', { licenceClass })).toBe(true);
      expect(fits([kHz, kHz + 0.5], 'data', { licenceClass })).toBe(false);
    }
  });

  it('40-phone-low: phone from 7075 to 7100 kHz in Regions 1 and 3, not in the middle of Region 2', () => {
    expect(rule('40-phone-low')?.inputs.kHz).toEqual([7075, 7100]);
    expect([1, 2, 3].map((region) => fits([7080, 7082.7], 'phone', { region }))).toEqual([true, false, true]);
  });

  it('5khz-6m-cw: the lowest 100 kHz of 6 m are for Morse', () => {
    const [low = NaN, high = NaN] = rule('5khz-6m-cw')?.inputs.kHz ?? [];
    const middle = (low + high) / 2;
    expect([fits([middle, middle + 0.2], 'CW'), fits([middle, middle + 2.7], 'phone')]).toEqual([
      true,
      false,
    ]);
  });
});
