import type { PlanDescription } from '@ferrite-row/api/plans/plan-description';
import { mixerAndBandPass, preDriver } from './conversion';
import { amplifierAndLowPass, driver, onTheAir } from './power';
import { balancedModulator, crystalFilter, ifAmplifier } from './sideband';
import { carrierOscillator, localOscillator, micAmplifier, supplyRails } from './sources';

/**
 * The demo club's own transmitter: single sideband and Morse on 20 metres, five watts. Invented for this club; it is no
 * copy of any published design, and its figures are chosen to fit together, not taken from a built example.
 */
export const LARKMOOR_TWENTY: PlanDescription = {
  name: 'Larkmoor Twenty',
  summary: 'A five-watt transmitter for single sideband and Morse on 20 metres, in twelve stages.',
  edition: 1,
  stages: [
    supplyRails,
    carrierOscillator,
    micAmplifier,
    balancedModulator,
    crystalFilter,
    ifAmplifier,
    localOscillator,
    mixerAndBandPass,
    preDriver,
    driver,
    amplifierAndLowPass,
    onTheAir,
  ],
};
