import type { UncertaintySource } from '../budget';
import { requireWithin } from '../domain';
import { hertz, ohms } from '../units';

/** A probe on a circuit. */
export interface ProbeLoadingInput {
  /** Resistance of the circuit at that point, everything on it together: 25 ohm between a 50 ohm source and its load. */
  circuitOhms: number;
  probeOhms: number;
  /** Of its tip with lead and clip. */
  probeFarads: number;
  frequencyHertz: number;
}

/** What a probe takes away from what it measures. */
export interface ProbeLoading {
  /** The level is so much lower with the probe on. */
  lossDb: number;
  /** For a budget that does not correct for it: the level may be anywhere from as read to that much higher. */
  source: UncertaintySource;
}

/**
 * How a probe loads the circuit it is put on, for a circuit that is resistive there.
 *
 * @throws OutOfDomainError naming the input.
 * @example probeLoading({ circuitOhms: 25, probeOhms: 10e6, probeFarads: 10e-12, frequencyHertz: 14.1e6 }).lossDb //=> 0.002152
 * @example probeLoading({ circuitOhms: 1000, probeOhms: 10e6, probeFarads: 10e-12, frequencyHertz: 14.1e6 }).lossDb //=> 2.516554
 * @see voltage divider, 20 log10|1 + R·Y|
 */
export function probeLoading({
  circuitOhms,
  probeOhms,
  probeFarads,
  frequencyHertz,
}: ProbeLoadingInput): ProbeLoading {
  const circuit = ohms(circuitOhms, 'circuitOhms');
  const conductance = 1 / ohms(probeOhms, 'probeOhms');
  requireWithin(
    { input: 'probeFarads', label: 'Capacitance of the probe', unit: 'F', atLeast: 0, atMost: 1e-6 },
    probeFarads,
  );
  const susceptance = 2 * Math.PI * hertz(frequencyHertz, 'frequencyHertz') * probeFarads;
  const lossDb = 20 * Math.log10(Math.hypot(1 + circuit * conductance, circuit * susceptance));
  return { lossDb, source: { name: 'probe loading', limit: lossDb, distribution: 'rectangular' } };
}
