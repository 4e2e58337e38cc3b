import fc from 'fast-check';
import { between } from '../../testing/between';
import { within } from '../../testing/within';
import { errorOf } from '../../testing/error-of';
import {
  frequencyGrid,
  ladderBuilds,
  ladderResponse,
  lowPassLadder,
  OutOfDomainError,
  spreadBands,
  type SpreadInput,
} from '../index';
import { valueAtRank } from './quantile';
import { seededRandom } from './random';

const ladder = lowPassLadder({
  family: 'Chebyshev',
  order: 5,
  rippleDb: 0.05,
  cutoffHertz: 15.5e6,
  sourceOhms: 50,
  first: 'shunt',
});
const input: SpreadInput = {
  ladder,
  capacitorToleranceRel: 0.05,
  inductorToleranceRel: 0.05,
  inductorQ: 180,
  builds: 400,
  seed: 2026,
};
const hertz = frequencyGrid(1e6, 60e6, 60);

describe('a spread of builds', () => {
  it('is the same for the same seed and another for another', () => {
    const again = ladderBuilds(input, hertz);
    expect(ladderBuilds(input, hertz).gainDb).toEqual(again.gainDb);
    expect(ladderBuilds({ ...input, seed: 2027 }, hertz).gainDb).not.toEqual(again.gainDb);
  });

  it('is the filter itself when nothing scatters', () => {
    const still = { ...input, capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 3 };
    const { gainDb } = ladderBuilds(still, hertz);
    const nominal = ladderResponse(ladder, hertz, input).gainDb;
    expect(gainDb.slice(2 * hertz.length)).toEqual(nominal);
  });

  it('moves only the parts that scatter, each evenly within its tolerance', () => {
    // One capacitor across the line, far above its corner: its gain tells its value.
    const one = lowPassLadder({
      family: 'Butterworth',
      order: 1,
      cutoffHertz: 1e3,
      sourceOhms: 50,
      first: 'shunt',
    });
    const many = {
      ladder: one,
      capacitorToleranceRel: 0.1,
      inductorToleranceRel: 0.5,
      builds: 4000,
      seed: 5,
    };
    const { gainDb } = ladderBuilds(many, Float64Array.of(1e8));
    const nominal = ladderResponse(one, Float64Array.of(1e8)).gainDb[0] ?? NaN;
    const moves = Array.from(gainDb, (gain) => 10 ** ((nominal - gain) / 20) - 1);
    expect(Math.max(...moves)).toBeLessThanOrEqual(0.1 + 1e-9);
    expect(Math.max(...moves)).toBeGreaterThan(0.099);
    expect(Math.min(...moves)).toBeLessThan(-0.099);
    // A rectangular distribution of half width a has the variance a²/3 (JCGM 100:2008, 4.3.7).
    const variance = moves.reduce((sum, move) => sum + move ** 2, 0) / moves.length;
    within(variance, 0.01 / 3, 0.05 * (0.01 / 3));
  });

  it('widens with its percentiles, from the median to the extremes', () => {
    const bands = spreadBands(ladderBuilds(input, hertz), [0, 2.5, 50, 97.5, 100]);
    hertz.forEach((_frequency, point) => {
      const values = bands.gainDb.map((band) => band[point] ?? NaN);
      expect(values).toEqual([...values].sort((a, b) => a - b));
    });
  });

  it('has the percentiles a full sort finds', () => {
    const made = ladderBuilds(input, Float64Array.of(28e6));
    const sorted = [...made.gainDb].sort((a, b) => a - b);
    const [low, high] = spreadBands(made).gainDb;
    expect(low?.[0]).toBe(sorted[Math.round(0.025 * 399)]);
    expect(high?.[0]).toBe(sorted[Math.round(0.975 * 399)]);
  });

  it('finds any rank as sorting does', () => {
    const values = fc.array(between(-10, 10), { minLength: 1, maxLength: 60 });
    fc.assert(
      fc.property(values, fc.nat(), (list, place) => {
        const rank = place % list.length;
        const sorted = [...list].sort((a, b) => a - b);
        expect(valueAtRank(Float64Array.from(list), rank) - (sorted[rank] ?? NaN)).toBe(0);
      }),
    );
  });

  it('draws evenly: each tenth of the range gets its share', () => {
    const random = seededRandom(1);
    const counts = new Array<number>(10).fill(0);
    for (let draw = 0; draw < 20_000; draw++) {
      const tenth = Math.floor(10 * random());
      counts[tenth] = (counts[tenth] ?? 0) + 1;
    }
    // 2000 expected in each; five standard deviations of a binomial are 212.
    for (const count of counts) within(count, 2000, 212);
  });

  it.each<[string, string, () => unknown]>([
    ['no builds', 'builds', () => ladderBuilds({ ...input, builds: 0 }, hertz)],
    ['half a build', 'builds', () => ladderBuilds({ ...input, builds: 1.5 }, hertz)],
    [
      'more than memory',
      'builds',
      () => ladderBuilds({ ...input, builds: 20_000 }, frequencyGrid(1e6, 2e6, 2001)),
    ],
    [
      'a tolerance of all',
      'capacitorToleranceRel',
      () => ladderBuilds({ ...input, capacitorToleranceRel: 1 }, hertz),
    ],
    ['a seed that is no number', 'seed', () => ladderBuilds({ ...input, seed: NaN }, hertz)],
    ['percentile 101', 'percentiles', () => spreadBands(ladderBuilds(input, hertz), [101])],
  ])('refuses %s by the name of the input', (_title, name, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(name);
  });
});
