import type { BuildCheck } from '../api/builds';

interface Offer {
  /** Undefined until it has arrived. */
  offered: readonly unknown[] | undefined;
  hasFailed: boolean;
  isChosen: boolean;
}

interface InstrumentWait {
  /** On the button, after "Keep, ". */
  short: string;
  reason: string;
}

/** Why a reading cannot be kept yet for want of what it was read on; undefined when it can. */
export function instrumentWait(
  { instrumentKindId }: Pick<BuildCheck, 'instrumentKindId'>,
  { offered, hasFailed, isChosen }: Offer,
): InstrumentWait | undefined {
  if (instrumentKindId === null || isChosen) return undefined;
  if (hasFailed)
    return {
      short: 'the instruments did not load',
      reason: 'A reading names the instrument it was taken with, and the list of them did not load.',
    };
  if (!offered) return { short: 'instruments are loading', reason: 'The instruments are being looked up.' };
  if (offered.length === 0)
    return {
      short: 'no instrument to name',
      reason: 'The club has no instrument of the kind this check asks for. Ask a steward.',
    };
  return {
    short: 'choose an instrument first',
    reason: 'None of the instruments can be used just now. The list says why of each.',
  };
}

/** The one chosen, or else the first that may be used. */
export const chosenOf = <T extends { id: string; reason: string | null }>(
  offered: readonly T[],
  id: string,
) => offered.find((instrument) => instrument.id === id) ?? offered.find(({ reason }) => reason === null);
