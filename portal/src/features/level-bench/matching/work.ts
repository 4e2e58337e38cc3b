import { workFlux, workSkin, type BandSheet } from './conductor';
import type { MatchingInputs } from './inputs';
import { workNetwork, type NetworkSheet } from './l-network';
import { workMatch, type MatchSheet } from './match';
import { workResonance, type ResonanceSheet } from './resonance';
import { workAir, workCore, type WindingSheet } from './windings';

export type MatchingSheet = MatchSheet | NetworkSheet | WindingSheet | ResonanceSheet | BandSheet;

const WORK: Record<MatchingInputs['calculation'], (values: MatchingInputs) => MatchingSheet> = {
  match: workMatch,
  'l-network': workNetwork,
  core: workCore,
  air: workAir,
  resonance: workResonance,
  skin: workSkin,
  flux: workFlux,
};

/** The calculation that is chosen. */
export const work = (values: MatchingInputs): MatchingSheet => WORK[values.calculation](values);
