/**
 * The line of the club's log detectors: 25 mV each decibel, down to -70 dBm. Such a slope and such an end are common
 * practice for logarithmic detectors; these are of no maker.
 */
export const DETECTOR = { voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5 } as const;
