import { IsDay, MayBeLeftOut } from '../../common/validators';
import type { AccountKind } from '../account.entity';
import type { TrialBalance } from '../ledger.rules';

export class TrialBalanceQueryDto {
  /** The last day that counts; today unless named. */
  @MayBeLeftOut()
  @IsDay()
  on?: string;
}

export class TrialBalanceLineDto {
  /** @example 1100 */
  code: string;
  /** @example Members owe */
  name: string;
  kind: AccountKind;
  debitMinor: number;
  creditMinor: number;
}

/** Every account on its side. The two totals are equal, or the books are wrong. */
export class TrialBalanceDto {
  asOn: string;
  accounts: TrialBalanceLineDto[];
  debitMinor: number;
  creditMinor: number;
}

export function trialBalanceDto(asOn: string, balance: TrialBalance): TrialBalanceDto {
  const accounts = balance.accounts.map(({ code, name, kind, debitMinor, creditMinor }) => ({
    code,
    name,
    kind,
    debitMinor,
    creditMinor,
  }));
  return { asOn, accounts, debitMinor: balance.debitMinor, creditMinor: balance.creditMinor };
}
