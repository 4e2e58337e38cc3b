import { fixed, signed } from '../../../lib/text';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { driveWords, exactText, padText, placeWords, sidebandWords } from './answer-words';
import { assumedFigures } from './assumed';
import { INPUTS } from './inputs';
import { rowsOf, type ProductRow } from './rows';
import { tuningWords } from './tuning-words';
import { afterFilter, belowWanted, decibels, megahertz, restWords, wordsOf } from './words';
import { RULE_SETS, type Mixing } from './work-out';

function productLine({ product, note }: ProductRow, mixing: Mixing): string {
  const [below, pm] = belowWanted(product);
  const parts = [
    `${product.name}${note && ` (${note})`} ${megahertz(product.hertz)} MHz`,
    `order ${product.order}`,
    `leaves the mixer at ${fixed(product.levelDbm)}`,
    `after the filter ${afterFilter(product)} dBm`,
    below && `${[below, pm].filter(Boolean).join(' ')} dB below the wanted`,
  ];
  const verdict =
    product.isWanted && product.verdict === 'pass' ? 'In the band' : VERDICTS[product.verdict].words;
  return `${parts.filter(Boolean).join(', ')}. ${verdict}. ${wordsOf(product, mixing)}.`;
}

function driveLine({ drive, values }: Mixing): string {
  const { advice, then } = driveWords(drive);
  const pad = drive.pad ? ` Pi pad ${padText(drive.pad)}, exact ${exactText(drive.pad)}.` : '';
  return `Drive ${signed(values.sourceDbm)} dBm against ${signed(values.ratedDbm)} rated. ${advice} ${then}${pad}`;
}

/** The result as plain lines, for a letter or a notebook. */
export function copiedText(mixing: Mixing): string {
  const { values, wanted, conversion, goalDbm } = mixing;
  const { shown, rest } = rowsOf(mixing);
  const filter = INPUTS.filter.options.find(({ value }) => value === values.filter)?.label ?? '';
  const assumed = assumedFigures(values).map(([name, figure]) => `${name.toLowerCase()} ${figure}`);
  return [
    `Mixer: IF ${megahertz(values.ifHertz)} MHz at ${fixed(values.ifDbm)} dBm, LO ${megahertz(values.loHertz)} MHz on the ${conversion.injection}, filter after it: ${filter}.`,
    `${wanted.name} ${megahertz(wanted.hertz)} MHz. ${placeWords(mixing)}`,
    `Sideband ${conversion.sideband}. ${sidebandWords(mixing)}`,
    driveLine(mixing),
    `Goal: ${decibels(values.goalDb)} below the wanted, ${fixed(goalDbm)} dBm after the filter.`,
    ...shown.map((row) => productLine(row, mixing)),
    restWords(rest, mixing),
    tuningWords(mixing),
    `Assumed, common practice: ${assumed.join('; ')}.`,
    RULE_SETS[values.ruleSet].caution,
  ].join('\n');
}
