import { formatQuantity, instrumentGuard, type GuardPad, type GuardResult } from '@ferrite-row/levels';
import { fixed, signed } from '../../../lib/text';
import type { GuardValues } from './inputs';
import type { Judged, JudgedFigure } from './judged';

const STATES: Record<GuardResult['state'], string> = {
  'would harm': 'Would harm it',
  'little room': 'Little room',
  'under the limit': 'Under its limit',
};

const ratingText = ({ ratingWatts }: GuardPad): string =>
  ratingWatts === undefined ? 'more than any in the list' : formatQuantity(ratingWatts, 'W');

function remedy({ pads, needsBlock }: GuardResult): JudgedFigure {
  const block = needsBlock ? 'A capacitor in series first: no pad keeps direct volts away.' : '';
  const [first] = pads;
  if (!first) {
    return needsBlock
      ? { name: 'Put in line', figure: 'A capacitor', words: block, tone: 'caution' }
      : { name: 'Put in line', figure: 'Nothing more', words: 'for this level and this room' };
  }
  return {
    name: 'Put in line, before power',
    figure: pads.map(({ lossDb }) => `${lossDb} dB`).join(' + '),
    words:
      `${block} Rating to buy: ${ratingText(first)}; ${formatQuantity(first.inputWatts, 'W')} go in.`.trim(),
    tone: 'caution',
  };
}

/** The level at the connector on a line, with the end it must keep under. */
export interface GuardBar {
  levelDbm: number;
  plusMinusDb: number;
  keptUnderDbm: number;
}

/** A level against what an instrument stands. */
export function judgeInstrument(values: GuardValues): Judged & { bar: GuardBar } {
  const result = instrumentGuard(values);
  const { state, worstDbm, roomDb, pads } = result;
  return {
    figures: [
      {
        name: 'At the connector, at worst',
        ...{ figure: signed(worstDbm), unit: 'dBm' },
        words: STATES[state],
        tone: state === 'under the limit' ? 'plain' : 'caution',
      },
      {
        name: 'Room to the damage level',
        ...{ figure: fixed(roomDb), unit: 'dB' },
        words: `${fixed(values.marginDb)} dB wanted`,
      },
      remedy(result),
    ],
    tables: [
      {
        title: 'Pads, from the stage on',
        heads: ['Pad', 'Goes in', 'Rating to buy'],
        rows: pads.map((pad, index) => ({
          cells: [
            `${pad.lossDb} dB${pads.length > 1 ? `, ${index === 0 ? 'first' : 'then'}` : ''}`,
            formatQuantity(pad.inputWatts, 'W'),
            ratingText(pad),
          ],
        })),
        none: 'None is needed for this level and this room.',
      },
    ],
    source:
      'Common practice: room of 10 dB, pads as they are sold, a resistor at half its rating. The damage level is the one on the instrument’s plate or in its manual.',
    caution: {
      kind: 'load before power',
      words:
        'Pads first, then power. The first pad takes nearly all of it and gets hot. Think of the greatest level the stage can give, not of the one hoped for.',
    },
    bar: {
      levelDbm: values.levelDbm - values.padsInLineDb,
      plusMinusDb: values.plusMinusDb,
      keptUnderDbm: values.damageDbm - values.marginDb,
    },
  };
}
