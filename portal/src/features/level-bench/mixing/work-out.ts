import {
  bandsOf,
  convert,
  driveCheck,
  IARU_REGION_1,
  judgeProducts,
  OutOfDomainError,
  US_97,
  type AmateurBand,
  type DriveCheck,
  type JudgedProducts,
  type MixerFigures,
  type RuleSet,
} from '@ferrite-row/levels';
import { curveOf, filterOf, gainOf, type Curve, type FilterFigures } from './filters';
import type { MixingValues } from './inputs';
import { lastOnly } from './last-only';
import { tuningOf, type Tuning } from './tuning';

export const RULE_SETS: Record<MixingValues['ruleSet'], RuleSet> = {
  'IARU-R1': IARU_REGION_1,
  'US-97': US_97,
};

/** All that the page shows, without a function in it, so that it can cross from a worker. */
export interface Mixing extends JudgedProducts {
  values: MixingValues;
  /** Of the rule set. */
  bands: AmateurBand[];
  /** The one the wanted product lies in, or the nearest. */
  band: AmateurBand;
  drive: DriveCheck;
  /** After the filter, dBm. */
  goalDbm: number;
  /** End of the frequency axis. */
  maxHertz: number;
  curve?: Curve;
  tuning: Tuning;
}

/**
 * All about a mixer, as `useWorked` or a worker calls it.
 * @throws LevelsError naming the input.
 */
export function workOut(values: MixingValues): Mixing {
  const conversion = convert(values.loHertz, values.ifHertz, values.wanted);
  const bands = bandsOn({ ruleSet: values.ruleSet, day: today() });
  const band = nearestBand(bands, conversion.hertz);
  const drive = driveCheck(values);
  const figures = filterFigures(values);
  const filter = filterOf(figures);
  const judged = judgeProducts({
    ...values,
    loDbm: drive.deliveredDbm,
    mixer: mixerOf(values),
    bandLowHertz: band.lowHertz,
    bandHighHertz: band.highHertz,
    ...(filter && { filterGainDb: gainOf(filter) }),
    filterPlusMinusDb: filter ? values.filterPlusMinusDb : 0,
  });
  const maxHertz = axisEnd(values.loHertz, conversion.hertz);
  const curve = curveOf({ figures, maxHertz });
  return {
    ...judged,
    values,
    bands,
    band,
    drive,
    goalDbm: judged.wanted.filteredDbm - values.goalDb,
    maxHertz,
    ...(curve && { curve }),
    tuning: tuningOf(values, conversion, band),
  };
}

const bandsOn = lastOnly(({ ruleSet, day }: Pick<MixingValues, 'ruleSet'> & { day: string }) =>
  bandsOf(RULE_SETS[ruleSet], day),
);

/** Nothing else, so that the curve stays as it is while other figures are typed. */
function filterFigures(values: MixingValues): FilterFigures {
  const { filter, order, inductorQ, centreHertz, bandwidthHertz, resonatorHenries, cutoffHertz } = values;
  return { filter, order, inductorQ, centreHertz, bandwidthHertz, resonatorHenries, cutoffHertz };
}

const today = (): string => new Date().toISOString().slice(0, 10);

const awayFrom = ({ lowHertz, highHertz }: AmateurBand, hertz: number): number =>
  Math.max(lowHertz - hertz, hertz - highHertz, 0);

/** The band a frequency lies in, else the one whose edge is nearest. */
function nearestBand(bands: readonly AmateurBand[], hertz: number): AmateurBand {
  const [first, ...others] = bands;
  if (!first) throw new OutOfDomainError('ruleSet', '', 'one with bands', 'This rule set has no bands.');
  return others.reduce((best, band) => (awayFrom(band, hertz) < awayFrom(best, hertz) ? band : best), first);
}

const STEP_HERTZ = 10e6;

/** Twice the higher of the two, rounded up to 10 MHz. */
export const axisEnd = (loHertz: number, wantedHertz: number): number =>
  Math.ceil((2 * Math.max(loHertz, wantedHertz)) / STEP_HERTZ) * STEP_HERTZ;

const mixerOf = (values: MixingValues): MixerFigures => ({
  ...values,
  conversionLoss: { db: values.conversionLoss, plusMinusDb: values.conversionLossPlusMinus },
  loLeakage: { db: values.loLeakage, plusMinusDb: values.leakagePlusMinus },
  ifLeakage: { db: values.ifLeakage, plusMinusDb: values.leakagePlusMinus },
});
