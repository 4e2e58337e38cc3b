import {
  clockText,
  dateText,
  dayText,
  formatInClubZone,
  formatSpan,
  lengthText,
  longDayText,
  monthText,
} from './club-time-text';
import { setClubCurrency } from './club-currency';
import { exampleAmount, formatAmount, formatMoney, readMoney } from './money';
import { capital, counted, countWord, fixed, initials, listText, plusMinus, signed } from './text';

describe('dates in words', () => {
  it('writes them as the club does', () => {
    expect(dayText('2026-10-15')).toBe('Thu 15 Oct');
    expect(dayText('2026-09-01')).toBe('Tue 1 Sep');
    expect(longDayText('2026-10-15')).toBe('Thursday 15 October');
    expect(dateText('2026-12-09')).toBe('9 Dec 2026');
    expect(monthText('2026-10-15')).toBe('October 2026');
    expect(formatInClubZone('2026-10-15T18:30:00Z')).toBe('Thu 15 Oct, 19:30');
  });

  it('names the second day of a stretch only when it is another one', () => {
    expect(formatSpan('2026-10-15T18:00:00Z', '2026-10-15T21:00:00Z')).toBe('19:00 to 22:00');
    expect(formatSpan('2026-10-15T21:00:00Z', '2026-10-16T08:00:00Z')).toBe('22:00 to Fri 16 Oct, 09:00');
  });

  it('writes clock and length', () => {
    expect(clockText(65)).toBe('01:05');
    expect(lengthText(150)).toBe('2 h 30');
    expect(lengthText(60)).toBe('1 h');
    expect(lengthText(45)).toBe('45 min');
  });
});

describe('money', () => {
  afterEach(() => setClubCurrency('GBP'));

  it('is written in the club’s currency, with as many decimals as ISO 4217 gives it', () => {
    setClubCurrency('JPY');
    expect([formatMoney(2400), formatAmount(-1234567), exampleAmount()]).toEqual([
      '2,400 JPY',
      '−1,234,567',
      '24',
    ]);
    expect([readMoney('2,400'), readMoney('24.5')]).toEqual([2400, undefined]);
    setClubCurrency('KWD');
    expect([formatMoney(2400), exampleAmount()]).toEqual(['2.400 KWD', '24.000']);
    expect([readMoney('2.4'), readMoney('2.4001')]).toEqual([2400, undefined]);
  });

  it('shows the pound, pence, thousands and a true minus', () => {
    expect(formatMoney(2400)).toBe('£24.00');
    expect(formatMoney(-2400)).toBe('−£24.00');
    expect(formatMoney(5, 'EUR')).toBe('€0.05');
    expect(formatMoney(2400, 'SEK')).toBe('24.00 SEK');
    expect(formatAmount(329135)).toBe('3,291.35');
    expect(formatAmount(123456789)).toBe('1,234,567.89');
  });

  it.each([
    ['24', 2400],
    ['£1,234.5', 123450],
    ['−3.20', -320],
    ['0.07', 7],
  ])('reads %s', (text, minor) => expect(readMoney(text)).toBe(minor));

  it.each(['', 'ten', '1.234', '1,23', '24.'])('refuses "%s" instead of guessing', (text) =>
    expect(readMoney(text)).toBeUndefined(),
  );
});

describe('numbers and lists in words', () => {
  it('counts in words up to twelve', () => {
    expect([countWord(0), countWord(2), countWord(12), countWord(13)]).toEqual(['no', 'two', 'twelve', '13']);
    expect(counted(1, 'entry', 'entries')).toBe('one entry');
    expect(capital(counted(2, 'booking'))).toBe('Two bookings');
  });

  it('writes levels with their sign, and no sign on nothing', () => {
    expect(signed(0.37, 2)).toBe('+0.37');
    expect(signed(-19.4)).toBe('−19.4');
    expect(signed(-0.04)).toBe('0.0');
    expect(signed(0.04)).toBe('0.0');
    expect(fixed(-6)).toBe('−6.0');
    expect(plusMinus(0.47, 2)).toBe('± 0.47');
  });

  it('joins names and takes initials', () => {
    expect(listText(['Hollis', 'Greta', 'Oona'])).toBe('Hollis, Greta and Oona');
    expect(initials('Tamsin Ardley')).toBe('TA');
    expect(initials('Ines')).toBe('I');
  });
});
