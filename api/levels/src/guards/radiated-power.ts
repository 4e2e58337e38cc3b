import { requireWithin } from '../domain';

/** Power of an emission; its limits are told without it too. */
export interface PowerInput {
  /** Peak envelope power of the transmitter, W. */
  peakWatts?: number;
  feedLossDb?: number;
  /** Of the antenna against a half-wave dipole, which is presumed where left out. */
  antennaGainDbd?: number;
}

/** Gain of a half-wave dipole in free space over all directions, as a power ratio: 2.15 dB. */
const DIPOLE_GAIN = 10 ** 0.215;

/** Radiated power of a transmitter, told against a dipole and against all directions alike. */
export interface RadiatedPower {
  erpWatts: number;
  eirpWatts: number;
}

/**
 * Effective radiated power of a transmitter behind a feeder and an antenna.
 *
 * @throws OutOfDomainError naming the input.
 * @example radiatedPower({ peakWatts: 10, antennaGainDbd: 3 }).erpWatts //=> 19.952623
 * @see 47 CFR 97.313(i): a half-wave dipole is presumed to have a gain of 1
 */
export function radiatedPower({
  peakWatts = NaN,
  feedLossDb = 0,
  antennaGainDbd = 0,
}: PowerInput): RadiatedPower {
  requireWithin(
    { input: 'peakWatts', label: 'Peak envelope power', unit: 'W', atLeast: 0, atMost: 1e9 },
    peakWatts,
  );
  requireWithin(
    { input: 'feedLossDb', label: 'Loss of the feeder', unit: 'dB', atLeast: 0, atMost: 200 },
    feedLossDb,
  );
  const gain = {
    input: 'antennaGainDbd',
    label: 'Gain of the antenna',
    unit: 'dBd',
    atLeast: -100,
    atMost: 100,
  };
  requireWithin(gain, antennaGainDbd);
  const erpWatts = peakWatts * 10 ** ((antennaGainDbd - feedLossDb) / 10);
  return { erpWatts, eirpWatts: erpWatts * DIPOLE_GAIN };
}
