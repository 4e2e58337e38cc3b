import {
  formatQuantity,
  harmonicFilterFor,
  judgeSpurs,
  rippleFromReturnLoss,
  spuriousLimit,
  type HarmonicFilter,
  type JudgedSpur,
  type RuleSet,
  type SpuriousLimit,
  type SpuriousRuleId,
} from '@ferrite-row/levels';
import { fixed, plusMinus, signed } from '../../../lib/text';
import type { GuardValues } from './inputs';
import type { Judged, JudgedFigure, JudgedTable } from './judged';
import { ruleSetOf, sourceOf } from './rule-set';

function ruleOf({ carrierHertz, installed }: GuardValues, { id, spurious }: RuleSet): SpuriousRuleId {
  if (carrierHertz >= 30e6) return spurious.from30MHz;
  return id === 'US-97' && installed === 'before' ? 'US below 30 MHz, before 2003' : spurious.below30MHz;
}

const HARMONICS: Record<number, string> = { 2: 'Second harmonic', 3: 'Third harmonic', 4: 'Fourth harmonic' };
const spurName = ({ harmonic }: JudgedSpur): string => HARMONICS[harmonic ?? 0] ?? 'Any other';

function spursOf(values: GuardValues, limit: SpuriousLimit): JudgedSpur[] {
  const { dbc2, dbc3, dbc4, dbcOther, spurUncertaintyDb: expandedUncertaintyDb } = values;
  const measured: [number | undefined, number | undefined][] = [
    [2, dbc2],
    [3, dbc3],
    [4, dbc4],
    [undefined, dbcOther],
  ];
  const spurs = measured.flatMap(([harmonic, dbc]) =>
    dbc === undefined ? [] : [{ harmonic, dbc, expandedUncertaintyDb }],
  );
  return spurs.length === 0 ? [] : judgeSpurs(limit, spurs).sort((a, b) => a.marginDb - b.marginDb);
}

const needsOf = (spurs: readonly JudgedSpur[]) =>
  spurs.flatMap(({ harmonic, neededDb }) => (harmonic === undefined ? [] : [{ harmonic, neededDb }]));

function filterOf(values: GuardValues, spurs: readonly JudgedSpur[]): HarmonicFilter | undefined {
  const needs = needsOf(spurs);
  if (needs.every(({ neededDb }) => neededDb === 0)) return undefined;
  const { carrierHertz, cutoffHertz, returnLossDb } = values;
  return harmonicFilterFor({
    carrierHertz,
    cutoffHertz,
    rippleDb: rippleFromReturnLoss(returnLossDb),
    needs,
  });
}

/** What the filter takes of each harmonic. */
function takenBy(values: GuardValues, spurs: readonly JudgedSpur[]): Map<number, number | undefined> {
  const filter = filterOf(values, spurs);
  return new Map(needsOf(spurs).map(({ harmonic }, index) => [harmonic, filter?.takenDb[index]]));
}

function filterFigure(values: GuardValues, spurs: readonly JudgedSpur[]): JudgedFigure {
  const name = 'Low-pass that would do';
  if (spurs.length === 0) return { name, figure: 'Not known', words: 'nothing measured yet' };
  if (spurs.every(({ neededDb }) => neededDb === 0)) return { name, figure: 'None asked for' };
  const filter = filterOf(values, spurs);
  if (!filter)
    return { name, figure: 'None up to 9', words: 'Filter better before the last stage.', tone: 'caution' };
  const words = `up to ${fixed(filter.cutoffHertz / 1e6, 2)} MHz, by the ideal response`;
  return { name, figure: `${filter.order} elements`, words };
}

function worstFigure(spurs: readonly JudgedSpur[]): JudgedFigure[] {
  const [worst] = spurs;
  if (!worst) return [];
  const isShort = worst.marginDb < 0;
  return [
    {
      name: isShort ? 'Short by' : 'In hand',
      ...{ figure: fixed(Math.abs(worst.marginDb)), unit: 'dB' },
      words: spurName(worst),
      tone: worst.verdict === 'pass' ? 'plain' : 'caution',
    },
  ];
}

function spurTable(values: GuardValues, limit: SpuriousLimit, spurs: readonly JudgedSpur[]): JudgedTable {
  const takenOf = takenBy(values, spurs);
  return {
    title: `Measured, against ${fixed(limit.attenuationDb)} dB`,
    heads: ['Emission', 'MHz', 'Measured, dBc', 'In hand, dB', 'Filter must take', 'It takes'],
    rows: spurs.map((spur) => {
      const { harmonic, dbc, marginDb, neededDb, verdict } = spur;
      const taken = takenOf.get(harmonic ?? 0);
      const cells = [
        spurName(spur),
        harmonic === undefined ? '' : fixed((harmonic * values.carrierHertz) / 1e6, 2),
        `${signed(dbc)} ${plusMinus(spur.expandedUncertaintyDb ?? 0)}`,
        signed(marginDb),
        neededDb === 0 ? '' : `${fixed(neededDb)} dB`,
        taken === undefined ? '' : `${fixed(taken)} dB`,
      ];
      return { cells, verdict };
    }),
    none: 'Nothing measured yet.',
  };
}

/** Each emission below the carrier, as measured and with the filter, for the chart. */
export interface SpurPicture {
  limitDbc: number;
  spurs: { name: string; dbc: number; filteredDbc: number | null }[];
}

function pictureOf(values: GuardValues, limit: SpuriousLimit, spurs: readonly JudgedSpur[]): SpurPicture {
  const takenOf = takenBy(values, spurs);
  const inOrder = [...spurs].sort((a, b) => (a.harmonic ?? 99) - (b.harmonic ?? 99));
  return {
    limitDbc: -limit.attenuationDb,
    spurs: inOrder.map((spur) => {
      const taken = takenOf.get(spur.harmonic ?? 0);
      return {
        name: spurName(spur),
        dbc: spur.dbc,
        filteredDbc: taken === undefined ? null : spur.dbc - taken,
      };
    }),
  };
}

/** Spurious emissions against the rule set's limit, and the filter they ask for. */
export function judgeSpurious(values: GuardValues): Judged & { spurs?: SpurPicture } {
  const set = ruleSetOf(values.ruleSet);
  const limit = spuriousLimit(ruleOf(values, set), values.carrierWatts);
  const spurs = spursOf(values, limit);
  return {
    figures: [
      {
        name: 'At least below the carrier',
        ...{ figure: fixed(limit.attenuationDb), unit: 'dB' },
        words: `at most ${formatQuantity(limit.greatestWatts, 'W')}, by ${limit.power}`,
      },
      ...worstFigure(spurs),
      filterFigure(values, spurs),
    ],
    tables: [spurTable(values, limit, spurs)],
    spurs: spurs.length === 0 ? undefined : pictureOf(values, limit, spurs),
    source: `${limit.rule}: ${limit.source}. ${sourceOf(set)}`,
    caution: {
      kind: 'licence needed',
      words: `${set.caution} Measure again with the filter in line, into a dummy load, before going on the air.`,
    },
  };
}
