import { requireSome, requireWithin } from '../domain';
import { LOW_HEADROOM_DB } from '../gain';
import { dB, dBm } from '../units';

/** One stage of a chain. */
export interface ChainStage {
  name: string;
  /** A loss is negative. */
  gainDb: number;
  /** 0 or more. Where left out, a stage that loses has its loss (a matched loss at 290 K), and one that gains is unknown. */
  noiseFigureDb?: number;
  /** Third-order intercept at its output; a stage without one adds no distortion. */
  outputInterceptDbm?: number;
  /** Output at which it has lost 1 dB of gain. */
  outputCompressionDbm?: number;
  /** Most the peaks at its output may be. */
  limitDbm?: number;
}

/** A chain and what goes into it. */
export interface ChainInput {
  /** Average level into the first stage. */
  inputDbm: number;
  /** Peak envelope power over average, dB: 0 for a carrier, 3.01 for two equal tones; 0 where left out. */
  peakOverAverageDb?: number;
  stages: readonly ChainStage[];
}

/** What leaves a stage, and what the chain up to it is like. */
export interface ChainRow {
  name: string;
  gainDb: number;
  averageDbm: number;
  /** Peak envelope power. */
  peakDbm: number;
  /** From the input of the chain to the output of this stage. */
  totalGainDb: number;
  /** Absent from the first stage on whose noise figure is not known. */
  noiseFigureDb?: number;
  /** At the chain's input, distortions adding in voltage: the worst case. Absent while no stage has an intercept. */
  inputInterceptDbm?: number;
  /** The same, distortions adding in power. */
  inputInterceptByPowerDbm?: number;
  /** At this stage's output, worst case. */
  outputInterceptDbm?: number;
  /** An estimate; absent while no stage has a compression point. */
  inputCompressionDbm?: number;
  outputCompressionDbm?: number;
  /** Third-order products of two tones of this peak power, below each tone; absent without an intercept. */
  intermodulationDbc?: number;
  /** Limit less peak; absent without a limit. */
  headroomDb?: number;
  /** Headroom under {@link LOW_HEADROOM_DB}. */
  isLow?: boolean;
}

const GREATEST_STAGES = 100;
/** Two equal tones each lie this far below their peak envelope power, dB: 20 log 2. */
const TONE_UNDER_PEAK_DB = 20 * Math.log10(2);

/**
 * Level, gain, noise, intercept, compression and headroom along a chain.
 *
 * @returns a row for each stage, in signal order; the last one is the whole chain.
 * @throws OutOfDomainError naming the input, a stage's by its place: `stages[2].gainDb`.
 * @example chainOf({ inputDbm: -10, stages: [{ name: 'mixer', gainDb: -6 }, { name: 'driver', gainDb: 20, limitDbm: 5 }] }).map(({ averageDbm }) => averageDbm) //=> [-16, 4]
 * @example chainOf({ inputDbm: -10, stages: [{ name: 'pad', gainDb: -6 }, { name: 'amplifier', gainDb: 20, noiseFigureDb: 4 }] })[1].noiseFigureDb //=> 10
 * @see H. T. Friis, Noise Figures of Radio Receivers (1944); intercept of a cascade: Microwave Engineering (textbook, from
 *   memory); compression of a cascade is an estimate of common practice
 */
export function chainOf({ inputDbm, peakOverAverageDb = 0, stages }: ChainInput): ChainRow[] {
  const input = dBm(inputDbm, 'inputDbm');
  const over = { input: 'peakOverAverageDb', label: 'Peak over average', unit: 'dB', atLeast: 0, atMost: 40 };
  requireWithin(over, peakOverAverageDb);
  requireSome({ input: 'stages', label: 'Stages' }, stages, GREATEST_STAGES);
  const sums = new ChainSums();
  return stages.map((stage, index) => {
    requireStage(stage, `stages[${index}]`);
    sums.add(stage);
    const averageDbm = dBm(input + sums.gainDb);
    const peakDbm = dBm(averageDbm + peakOverAverageDb);
    return {
      name: stage.name,
      gainDb: stage.gainDb,
      averageDbm,
      peakDbm,
      totalGainDb: sums.gainDb,
      ...sums.figures(),
      ...distortionAt(peakDbm, sums.figures().outputInterceptDbm),
      ...headroomAt(peakDbm, stage.limitDbm),
    };
  });
}

function requireStage(stage: ChainStage, place: string): void {
  dB(stage.gainDb, `${place}.gainDb`);
  const figures: [keyof ChainStage, number | undefined][] = [
    ['outputInterceptDbm', stage.outputInterceptDbm],
    ['outputCompressionDbm', stage.outputCompressionDbm],
    ['limitDbm', stage.limitDbm],
  ];
  for (const [name, value] of figures) if (value !== undefined) dBm(value, `${place}.${name}`);
  if (stage.noiseFigureDb === undefined) return;
  const noise = { input: `${place}.noiseFigureDb`, label: `Noise figure of ${stage.name}`, unit: 'dB' };
  requireWithin({ ...noise, atLeast: 0, atMost: 200 }, stage.noiseFigureDb);
}

const ratio = (decibels: number) => 10 ** (decibels / 10);
const decibels = (value: number) => 10 * Math.log10(value);

/** Running sums of a chain, all referred to its input. */
class ChainSums {
  gainDb = 0;
  private noiseFactor: number | undefined = 1;
  /** Reciprocal intercepts: in 1/mW adding in voltage, in 1/mW² adding in power. */
  private distortion = 0;
  private distortionSquared = 0;
  private compression = 0;

  add(stage: ChainStage): void {
    const before = ratio(this.gainDb);
    const noise = stage.noiseFigureDb ?? (stage.gainDb <= 0 ? -stage.gainDb : undefined);
    if (this.noiseFactor !== undefined) {
      this.noiseFactor = noise === undefined ? undefined : this.noiseFactor + (ratio(noise) - 1) / before;
    }
    if (stage.outputInterceptDbm !== undefined) {
      const share = before / ratio(stage.outputInterceptDbm - stage.gainDb);
      this.distortion += share;
      this.distortionSquared += share ** 2;
    }
    if (stage.outputCompressionDbm !== undefined) {
      this.compression += before / ratio(stage.outputCompressionDbm - stage.gainDb + 1);
    }
    this.gainDb += stage.gainDb;
  }

  figures() {
    return { noiseFigureDb: this.noise(), ...this.intercepts(), ...this.compressions() };
  }

  private noise(): number | undefined {
    return this.noiseFactor === undefined ? undefined : decibels(this.noiseFactor);
  }

  private intercepts() {
    if (this.distortion === 0) return { outputInterceptDbm: undefined };
    const inputInterceptDbm = -decibels(this.distortion);
    return {
      inputInterceptDbm,
      inputInterceptByPowerDbm: -decibels(Math.sqrt(this.distortionSquared)),
      outputInterceptDbm: inputInterceptDbm + this.gainDb,
    };
  }

  private compressions() {
    if (this.compression === 0) return {};
    const inputCompressionDbm = -decibels(this.compression);
    return { inputCompressionDbm, outputCompressionDbm: inputCompressionDbm + this.gainDb - 1 };
  }
}

function distortionAt(peakDbm: number, interceptDbm: number | undefined) {
  if (interceptDbm === undefined) return {};
  return { intermodulationDbc: -2 * (interceptDbm - (peakDbm - TONE_UNDER_PEAK_DB)) };
}

function headroomAt(peakDbm: number, limitDbm: number | undefined) {
  if (limitDbm === undefined) return {};
  const headroomDb = limitDbm - peakDbm;
  return { headroomDb, isLow: headroomDb < LOW_HEADROOM_DB };
}
