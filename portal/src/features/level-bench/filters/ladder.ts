import {
  coupledResonatorBandPass,
  fitLadder,
  highPassLadder,
  lowPassLadder,
  rippleFromReturnLoss,
  trimmedLadder,
  turnsFor,
  type FittedLadder,
  type Ladder,
} from '@ferrite-row/levels';
import { named } from './field-names';
import type { FilterValues } from './inputs';

/** A_L in nH per turn squared; the field gives henries. */
const coreOf = ({ alNanohenry }: Pick<FilterValues, 'alNanohenry'>): number =>
  Number((alNanohenry * 1e9).toPrecision(12));

const rippleOf = ({ family, returnLossDb }: FilterValues): { rippleDb?: number } =>
  family === 'Chebyshev' ? { rippleDb: rippleFromReturnLoss(returnLossDb) } : {};

/** The ladder as the book has it. */
export function exactLadder(values: FilterValues): Ladder {
  const { kind, family, sourceOhms, cutoffHertz, lowEdgeHertz } = values;
  const shape = { family, ...rippleOf(values), sourceOhms };
  const order = Number(values.order);
  if (kind === 'low-pass') return lowPassLadder({ ...shape, order, cutoffHertz, first: 'shunt' });
  if (kind === 'high-pass') {
    return named({ cutoffHertz: 'lowEdgeHertz' }, () =>
      highPassLadder({ ...shape, order, cutoffHertz: lowEdgeHertz, first: 'series' }),
    );
  }
  return coupledResonatorBandPass({
    ...shape,
    order: Number(values.resonators),
    centreHertz: values.centreHertz,
    bandwidthHertz: values.bandwidthHertz,
    loadOhms: sourceOhms,
    // The coil has whole turns, so the rest is designed round the coil there will be.
    resonatorHenries: named({ henries: 'resonatorHenries' }, () =>
      turnsFor(values.resonatorHenries, coreOf(values)),
    ).henries,
  });
}

/** Where resonators are trimmed to, if they are. */
export const trimmedAt = ({ kind, trimmed, centreHertz }: FilterValues): number | undefined =>
  kind === 'band-pass' && trimmed === 'yes' ? centreHertz : undefined;

/** The nearest parts as the builder leaves them: resonators turned to the centre where they have trimmers. */
export function setUp(fitted: Ladder, values: FilterValues): Ladder {
  const centre = trimmedAt(values);
  if (centre === undefined) return fitted;
  return named({ ladder: 'resonatorHenries' }, () => trimmedLadder(fitted, centre));
}

/** The nearest ladder that can be built: one capacitor or two in parallel, whole turns. */
export const fittedLadder = (exact: Ladder, values: FilterValues): FittedLadder =>
  fitLadder(exact, {
    capacitors: { series: values.series, atMostParts: 2, arrangements: ['parallel'] },
    inductors: { alNanohenry: coreOf(values) },
  });
