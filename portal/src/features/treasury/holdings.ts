import type { Summary } from './api/treasury';

type Holdings = Summary['holdings'];

/** What lies outside the bank, by name; nothing is named that is nothing, but the cash box always is. */
export function partsOf(holdings: Holdings): [name: string, amountMinor: number][] {
  const parts: [string, number][] = [
    ['Box', holdings.cashBoxMinor],
    ['Cheques', holdings.chequesInHandMinor],
    ['Card money', holdings.cardMoneyMinor],
    ['Transfers', holdings.transfersOnTheWayMinor],
  ];
  return parts.filter(([name, minor]) => name === 'Box' || minor !== 0);
}

export const cashAndCardMinor = (holdings: Holdings): number =>
  partsOf(holdings).reduce((sum, [, minor]) => sum + minor, 0);

export const heldMinor = (holdings: Holdings): number =>
  holdings.currentAccountMinor + cashAndCardMinor(holdings);
