import type { CautionKind } from '../../../shared-ui/caution-symbols';
import type { Caution } from '../api/builds';

export interface CautionWords {
  kind: CautionKind;
  /** What to do. */
  text: string;
  /** Asked for with each reading; only grave ones have it. */
  tick?: string;
}

/** The graver first. Figures are those of the design's cautions; every club's local rules go before them. */
const CAUTIONS: [Caution, CautionWords][] = [
  [
    'licence needed',
    {
      kind: 'licence needed',
      text: 'Transmit into an aerial only under a licence that covers it. Use the dummy load until then.',
      tick: 'A licence for this is in force here',
    },
  ],
  [
    'rf exposure',
    {
      kind: 'RF exposure',
      text: 'Do not key into an aerial until its exposure check is on file. Local rules decide on distance and time.',
      tick: 'The exposure check for this aerial is on file',
    },
  ],
  [
    'rf power',
    {
      kind: 'RF power',
      text: 'Five watts at the output: burns from radio frequency are deep. Check the dummy load, then say “power on” to the bench.',
      tick: 'The dummy load is connected',
    },
  ],
  [
    'mains',
    {
      kind: 'mains and high voltage',
      text: 'Only a mentor cleared for mains opens this supply. Unplug it and let it discharge first.',
      tick: 'A mentor cleared for mains is with me',
    },
  ],
  ['load before power', { kind: 'load before power', text: 'Fit the 50 ohm load before switching on.' }],
  [
    'hot parts',
    {
      kind: 'hot parts',
      text: 'Heatsinks stay hot for ten minutes after. Let them cool before you touch them.',
    },
  ],
];

/** A stage's cautions, the graver first and at most two at once. */
export function cautionsOf(cautions: readonly Caution[]): CautionWords[] {
  return CAUTIONS.filter(([caution]) => cautions.includes(caution))
    .map(([, words]) => words)
    .slice(0, 2);
}

/** The ticks a reading of this stage asks for; the server asks for one, the form shows each beside its caution. */
export const gravesOf = (cautions: readonly Caution[]): CautionWords[] =>
  cautionsOf(cautions).filter(({ tick }) => tick !== undefined);

export const mildOf = (cautions: readonly Caution[]): CautionWords[] =>
  cautionsOf(cautions).filter(({ tick }) => tick === undefined);
