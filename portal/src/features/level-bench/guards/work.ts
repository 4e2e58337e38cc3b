import { LevelsError, OutOfDomainError } from '@ferrite-row/levels';
import { judgeBand, type BandPicture } from './band';
import { judgeExposure } from './exposure';
import { judgeHeat, type HeatPicture } from './heat';
import { type INPUTS, type GuardValues, type Judge } from './inputs';
import { judgeInstrument, type GuardBar } from './instrument';
import type { Judged } from './judged';
import { judgeSpurious, type SpurPicture } from './spurious';

export type Shown = Judged & {
  judge: Judge;
  picture?: BandPicture;
  heat?: HeatPicture;
  bar?: GuardBar;
  spurs?: SpurPicture;
};

const JUDGES: Record<Judge, (values: GuardValues) => Omit<Shown, 'judge'>> = {
  instrument: judgeInstrument,
  spurious: judgeSpurious,
  band: judgeBand,
  exposure: judgeExposure,
  heat: judgeHeat,
};

/** Fields of the page where the levels package has another name for what is typed in them. */
const FIELDS: Record<string, keyof typeof INPUTS> = {
  frequencyHertz: 'carrierHertz',
  lowHertz: 'carrierHertz',
  highHertz: 'carrierHertz',
  rippleDb: 'returnLossDb',
  parts: 'otherParts',
  amperes: 'supplyAmperes',
  lengthMetres: 'wireMetres',
  areaSquareMetres: 'wireSquareMillimetres',
  'onFraction.controlled': 'onMinutes',
  'onFraction.uncontrolled': 'onMinutes',
};

/** What is chosen at the top, judged. */
export function work(values: GuardValues): Shown {
  try {
    return { judge: values.judge, ...JUDGES[values.judge](values) };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    throw new OutOfDomainError(
      FIELDS[error.input] ?? error.input,
      error.value,
      error.permitted,
      error.message,
    );
  }
}
