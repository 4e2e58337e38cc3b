import { readSettings } from './settings';

const GOOD = { PORT: '0', FAKE_SECRET_KEY: 'sk_test_x', FAKE_WEBHOOK_SECRET: 'whsec_x' };

describe('settings of the payment stand-in', () => {
  it('take the usual tariff when none is set', () => {
    expect(readSettings(GOOD).fee).toEqual({ basisPoints: 150, fixedMinor: 20 });
  });

  it.each(['PORT', 'FAKE_SECRET_KEY', 'FAKE_WEBHOOK_SECRET'])('name what is missing: %s', (name) => {
    expect(() => readSettings({ ...GOOD, [name]: undefined })).toThrow(`${name} is not set`);
  });

  it.each([
    ['PORT', '65536'],
    ['PORT', '-1'],
    ['FAKE_FEE_BASIS_POINTS', '1.5'],
    ['FAKE_LATE_MS', 'soon'],
  ])('refuse %s=%s and say so', (name, value) => {
    expect(() => readSettings({ ...GOOD, [name]: value })).toThrow(name);
  });
});
