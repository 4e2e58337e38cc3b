import { sumMinor } from '../common/minor-units';
import type { AccountKind } from './account.entity';

export interface Side {
  accountCode: string;
  /** Debits positive, credits negative. */
  amountMinor: number;
}

export interface AccountBalance {
  code: string;
  name: string;
  kind: AccountKind;
  balanceMinor: number;
}

export interface TrialBalance {
  accounts: (AccountBalance & { debitMinor: number; creditMinor: number })[];
  debitMinor: number;
  creditMinor: number;
}

/** Leaves out what moves nothing, so that a payment without excess needs no special case. */
export function sidesOf(...sides: Side[]): Side[] {
  return sides.filter(({ amountMinor }) => amountMinor !== 0);
}

/** @throws RangeError when the sides cannot be an entry; the database would refuse it too, but later. */
export function checkSides(sides: readonly Side[]): void {
  if (sides.length < 2) throw new RangeError('An entry has at least two postings.');
  const sum = sumMinor(sides.map(({ amountMinor }) => amountMinor));
  if (sum !== 0) throw new RangeError(`The entry is out of balance by ${sum}.`);
}

export function reversed(sides: readonly Side[]): Side[] {
  return sides.map(({ accountCode, amountMinor }) => ({ accountCode, amountMinor: -amountMinor }));
}

/** Each account on its side; both totals are equal when every entry balances. */
export function trialBalance(balances: readonly AccountBalance[]): TrialBalance {
  const accounts = balances.map((account) => ({
    ...account,
    debitMinor: Math.max(account.balanceMinor, 0),
    creditMinor: Math.max(-account.balanceMinor, 0),
  }));
  return {
    accounts,
    debitMinor: sumMinor(accounts.map((account) => account.debitMinor)),
    creditMinor: sumMinor(accounts.map((account) => account.creditMinor)),
  };
}
