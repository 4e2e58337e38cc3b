import { describe, expect, it } from 'vitest';
import { classFigures } from './assumed';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { driveWords, exactText, padText, placeWords, sidebandWords } from './answer-words';
import { copiedText } from './copied-text';
import { rowsOf } from './rows';
import { tuningWords } from './tuning-words';
import { restWords, spokenProduct, spread, wordsOf } from './words';
import { workOut } from './work-out';
import { valuesWith } from './work-out.test-values';

const mixed = (texts?: Record<string, string>) => workOut(valuesWith(texts));
const mixing = mixed();
const { shown, rest } = rowsOf(mixing);
const wordsFor = (name: string, of = mixing) => {
  const product = [of.wanted, ...of.others].find((one) => one.name === name);
  return product && wordsOf(product, of);
};

describe('words beside a verdict', () => {
  it('say what to do when it is too close to call', () => {
    expect(wordsFor('LO + IF')).toBe('Measure it after the filter');
  });

  // By hand: 70.9 below, ± √(10² + 4² + 1²) = 10.8, leaves 0.1 over the 60 wanted.
  it('say what is in hand where it is little, and never more than there is', () => {
    expect(wordsFor('LO')).toBe('0.1 dB in hand');
  });

  it('say why, where there is plenty', () => {
    expect(wordsFor('IF')).toBe('The filter takes it');
    expect(wordsFor('4·IF − LO')).toBe('1.6 MHz under the band');
    expect(wordsFor('2·IF')).toBe('3.4 MHz over the band');
    expect(wordsFor('2·LO − 2·IF')).toBe('Under the noise');
  });

  it('say how much is missing', () => {
    // Without a filter the sum is as strong as the difference.
    expect(wordsFor('LO + IF', mixed({ filter: 'none' }))).toBe('60.0 dB short');
  });

  it('say where the wanted product lies when that is no band', () => {
    const off = mixed({ loHertz: '24' });
    expect(wordsFor('LO − IF', off)).toBe('0.783 MHz over the 20 m band');
    expect(placeWords(off)).toBe('In no amateur band. The nearest is 20 m, 14.000 to 14.350 MHz.');
  });
});

describe('the answer', () => {
  it('names the band, the sideband and the pad', () => {
    expect(placeWords(mixing)).toBe('In 14.000 to 14.350 MHz. No other product to order 7 is.');
    expect(sidebandWords(mixing)).toBe('Lower at the IF comes out upper on the air.');
    expect(driveWords(mixing.drive)).toEqual({
      advice: 'Use a 3 dB pad.',
      then: 'Nearest values give 2.99 dB, +7.01 dBm.',
    });
  });

  // Matched pi of 3 dB in 50 ohm: 50·(k + 1)/(k − 1) and 25·(k − 1/k), k = 10^(3/20).
  it('tells the pad’s nearest and exact values', () => {
    const { pad } = mixing.drive;
    expect(pad && [padText(pad), exactText(pad)]).toEqual(['300, 18, 300 ohm', '292, 17.61, 292']);
  });

  it('offers no pad for too little drive, and none for the right one', () => {
    expect(driveWords(mixed({ sourceDbm: '4' }).drive).advice).toBe('3 dB too weak.');
    expect(driveWords(mixed({ sourceDbm: '7.5' }).drive).advice).toBe('As rated.');
  });

  it('says what to buy when the pad gets warm', () => {
    expect(driveWords(mixed({ sourceDbm: '33' }).drive).then).toMatch(/Resistors of \d W or more\.$/);
  });
});

describe('a product aloud', () => {
  it('is read as a person would say it', () => {
    const sum = shown.find(({ product }) => product.name === 'LO + IF');
    expect(sum && spokenProduct(sum, VERDICTS[sum.product.verdict].words)).toBe(
      'LO plus IF, 31.934 megahertz, order 2. Leaves the mixer at −16.5, after the filter −82.5 dBm, 63.5 plus or minus 4 below. Too close to call.',
    );
  });
});

describe('figures', () => {
  it('carry two digits of uncertainty at most', () => {
    expect([4, 4.12, 9.96, 10.82].map(spread)).toEqual(['± 4', '± 4.1', '± 10', '± 11']);
  });

  it('promise of the rest no less than its strongest', () => {
    const words = restWords(rest, mixing);
    const strongest = Math.max(...rest.map(({ product }) => product.filteredDbm));
    const [, count, above] = /^(\d+) more to order 7, none above −(\d+) dBm/.exec(words) ?? [];
    expect(Number(count)).toBe(56 - shown.length);
    expect(-Number(above)).toBeGreaterThanOrEqual(strongest);
  });
});

describe('copied as text', () => {
  it('holds answer, goal, rows, assumptions and the caution, a line each', () => {
    const lines = copiedText(mixing).split('\n');
    expect(lines).toContain('Goal: 60 dB below the wanted, −79.0 dBm after the filter.');
    expect(lines).toContain(
      'LO + IF (sum) 31.934 MHz, order 2, leaves the mixer at −16.5, after the filter −82.5 dBm, 63.5 ± 4 dB below the wanted. Too close to call. Measure it after the filter.',
    );
    expect(lines).toContain(tuningWords(mixing));
    expect(lines.at(-1)).toMatch(/licence/);
    expect(lines.join('')).not.toMatch(/NaN|Infinity|undefined/);
  });
});

describe('a ring’s class', () => {
  // Common practice: compression 4 to 7 dB under the drive, intercept 5 to 10 dB over it.
  it('is told for the drive it is rated for', () => {
    expect(classFigures({ ratedDbm: 7 })).toEqual([
      ['A ring of this drive intercepts at', '+12 to +17 dBm'],
      ['and compresses from', '0 to +3 dBm'],
    ]);
    expect(classFigures({ ratedDbm: 17 })[1]).toEqual(['and compresses from', '+10 to +13 dBm']);
  });
});
