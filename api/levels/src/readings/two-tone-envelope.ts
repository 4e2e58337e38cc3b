import { wattsFromDbm } from '../conversions';
import { oscilloscopeReading } from '../oscilloscope';
import type { OscilloscopeInput } from '../oscilloscope';
import type { LevelReading } from '../reading';
import { dBm } from '../units';

/** Peak envelope power of two equal tones, with what follows from it. */
export interface TwoToneEnvelopeReading extends LevelReading {
  /** Half of the peak envelope power. */
  averageDbm: number;
  averageWatts: number;
  /** A quarter of it. */
  eachToneDbm: number;
}

/**
 * Peak envelope power and average of two equal tones from their envelope on an oscilloscope.
 *
 * @param input - as for a carrier; `divisionsPeakToPeak` is the height of the envelope at its widest.
 * @returns peak envelope power in dBm with the budget of `oscilloscopeReading`; volts peak to peak at the widest; watts.
 * @throws OutOfDomainError as `oscilloscopeReading`.
 * @example twoToneEnvelopeReading({ voltsPerDivision: 5, divisionsPeakToPeak: 4, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }).watts //=> 100
 * @example twoToneEnvelopeReading({ voltsPerDivision: 5, divisionsPeakToPeak: 4, readToDivisions: 0.1, probeRatio: 10, loadOhms: 50 }).averageWatts //=> 50
 * @see 47 CFR 97.3(b): peak envelope power is the average over one cycle at the crest; two equal tones: PEP = 2 × average
 */
export function twoToneEnvelopeReading(input: OscilloscopeInput): TwoToneEnvelopeReading {
  const reading = oscilloscopeReading(input);
  const averageDbm = reading.value - 10 * Math.log10(2);
  return {
    ...reading,
    calculation: 'two-tone-envelope/1',
    averageDbm,
    averageWatts: wattsFromDbm(dBm(averageDbm)),
    eachToneDbm: reading.value - 20 * Math.log10(2),
  };
}
