import { within } from '../../testing/within';
import { errorOf } from '../../testing/error-of';
import { simulatedLadder } from '../../testing/simulated-ladder';
import {
  coupledResonatorBandPass,
  frequencyGrid,
  ladderBuilds,
  ladderResponse,
  lowPassLadder,
  spreadBands,
  trimmedLadder,
} from '../index';

const CENTRE = 14.175e6;
const ladder = coupledResonatorBandPass({
  ...{ family: 'Chebyshev', order: 3, rippleDb: 0.05, centreHertz: CENTRE, bandwidthHertz: 700e3 },
  ...{ sourceOhms: 50, loadOhms: 50, resonatorHenries: 500e-9 },
});
const q = { inductorQ: 180, capacitorQ: 500 };
const builds = {
  ladder,
  ...q,
  capacitorToleranceRel: 0.05,
  inductorToleranceRel: 0.05,
  builds: 400,
  seed: 1,
};
const hertz = frequencyGrid(13.9e6, 14.5e6, 13);

/** The whole ladder with every part off by what the builder happened to find, trimmed again. */
const offBy = (parts: readonly number[]) =>
  trimmedLadder(
    {
      ...ladder,
      elements: ladder.elements.map((element, index) => ({
        ...element,
        value: element.value * (1 + (parts[index % parts.length] ?? 0)),
      })),
    },
    CENTRE,
  );

describe('a band-pass trimmed to its centre', () => {
  it('is the design itself when no part is off', () => {
    trimmedLadder(ladder, CENTRE).elements.forEach(({ value }, index) => {
      within(value / (ladder.elements[index]?.value ?? NaN), 1, 1e-9);
    });
    const still = { ...builds, capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 2 };
    const trimmed = ladderBuilds({ ...still, trimmedAtHertz: CENTRE }, hertz).gainDb;
    ladderBuilds(still, hertz).gainDb.forEach((gain, index) => within(trimmed[index], gain, 1e-6));
  });

  it('turns only the capacitors beside the coils', () => {
    const moved = offBy([0.03, -0.04, 0.05]);
    const changed = moved.elements.filter(
      ({ value }, index) =>
        Math.abs(
          value / ((ladder.elements[index]?.value ?? NaN) * (1 + ([0.03, -0.04, 0.05][index % 3] ?? 0))) - 1,
        ) > 1e-12,
    );
    expect(changed.map(({ place, part }) => [place, part])).toEqual(Array(3).fill(['shunt', 'capacitor']));
  });

  it('passes its band as designed though its coils are 5 % off, simulated in ngspice', () => {
    const nominal = simulatedLadder(ladder, Array.from(hertz), q);
    simulatedLadder(offBy([0.02, 0, 0.05, -0.02]), Array.from(hertz), q).forEach((point, index) =>
      within(point.gainDb, nominal[index]?.gainDb ?? NaN, 1),
    );
  });

  it('holds the builds together where parts as they come scatter them', () => {
    const spreadAt = (trimmedAtHertz?: number) => {
      const { gainDb } = spreadBands(
        ladderBuilds({ ...builds, trimmedAtHertz }, Float64Array.of(CENTRE)),
        [2.5, 97.5],
      );
      return (gainDb[1]?.[0] ?? NaN) - (gainDb[0]?.[0] ?? NaN);
    };
    expect(spreadAt()).toBeGreaterThan(3);
    expect(spreadAt(CENTRE)).toBeLessThan(0.5);
  });

  it('gives, where nothing scatters, the ladder trimmed by hand', () => {
    const one = { ...builds, builds: 1, inductorToleranceRel: 0, capacitorToleranceRel: 0 };
    const shifted = offBy([0.01]);
    const { gainDb } = ladderBuilds({ ...one, ladder: shifted, trimmedAtHertz: CENTRE }, hertz);
    ladderResponse(shifted, hertz, q).gainDb.forEach((gain, index) => within(gainDb[index], gain, 1e-9));
  });

  it('is refused for a ladder without resonators to ground', () => {
    const low = lowPassLadder({
      family: 'Butterworth',
      order: 3,
      cutoffHertz: 1e7,
      sourceOhms: 50,
      first: 'shunt',
    });
    expect(errorOf(() => trimmedLadder(low, CENTRE)).input).toBe('ladder');
    expect(errorOf(() => trimmedLadder(ladder, 10 * CENTRE)).message).toContain('Take less inductance');
    expect(errorOf(() => trimmedLadder(ladder, 0)).input).toBe('centreHertz');
    expect(errorOf(() => ladderBuilds({ ...builds, trimmedAtHertz: NaN }, hertz)).input).toBe(
      'trimmedAtHertz',
    );
  });
});
