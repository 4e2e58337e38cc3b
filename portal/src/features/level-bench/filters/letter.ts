import { formatQuantity } from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import { BUILDS } from './builds';
import type { FilterFigures } from './figures';
import type { Judged } from './judged';
import { ruleWords } from './limits';
import { partRows } from './parts';
import { grouped, inHandWords, nameOf, returnLossWords } from './words';

const KINDS = { 'low-pass': 'Low-pass', 'high-pass': 'High-pass', 'band-pass': 'Band-pass' } as const;

function designWords({ values }: FilterFigures): string {
  const { kind, family, order, resonators, trimmed } = values;
  const mhz = (hertz: number) => `${Number((hertz / 1e6).toPrecision(6))} MHz`;
  const size = kind === 'band-pass' ? `${resonators} resonators` : `${order} elements`;
  const setting = kind === 'band-pass' && trimmed === 'yes' ? ', resonators trimmed to the centre' : '';
  const edge = {
    'low-pass': `edge ${mhz(values.cutoffHertz)}`,
    'high-pass': `edge ${mhz(values.lowEdgeHertz)}`,
    'band-pass': `centre ${mhz(values.centreHertz)}, bandwidth ${mhz(values.bandwidthHertz)}`,
  }[kind];
  const match =
    family === 'Chebyshev' ? `, return loss ${Number(values.returnLossDb.toPrecision(3))} dB` : '';
  return `${KINDS[kind]}, ${family}, ${size}, ${edge}${match}, ${formatQuantity(values.sourceOhms, 'ohm')}${setting}`;
}

/** All of it as plain lines, for a letter. */
export function inText(figures: FilterFigures, judged: Judged): string {
  const { values, fitted, against } = figures;
  const tolerance = Number((values.toleranceRel * 100).toPrecision(3));
  return [
    designWords(figures),
    ...partRows(fitted).map(({ names, exact, nearest }) => `${names}: ${nearest} (exact ${exact})`),
    `Coil Q ${values.inductorQ}, capacitor Q ${values.capacitorQ}, parts ± ${tolerance} %, ${grouped(BUILDS)} builds from seed ${values.seed}`,
    ...(against.rule
      ? [
          `${against.rule.rule}: ${ruleWords(against.rule, against.carrierWatts)} Source: ${against.rule.source}.`,
        ]
      : []),
    ...judged.limits.map(
      (limit) =>
        `${nameOf(limit)}: ${fixed(limit.takenDb)} dB taken, ${fixed(limit.neededDb)} needed, ${inHandWords(limit)}: ${limit.verdict}`,
    ),
    `Return loss in the band: ${fixed(judged.returnLoss.db)} dB, ${returnLossWords(judged.returnLoss)}`,
    `Insertion loss: ${fixed(figures.insertionLossDb, 2)} dB, ${formatQuantity(figures.heatWatts, 'W')} lost as heat`,
    'Your licence and local rules decide. Measure it into a dummy load before it goes on the air.',
  ].join('\n');
}
