import { Check, Column, Entity, PrimaryColumn, Unique } from 'typeorm';

export const ACCOUNT_KINDS = ['asset', 'liability', 'income', 'expense', 'equity'] as const;
export type AccountKind = (typeof ACCOUNT_KINDS)[number];

/** The accounts that code posts to. More may be opened; these are written by the migration. */
export const ACCOUNTS = {
  cashBox: '1000',
  chequesInHand: '1010',
  /** Posted to by matched statement lines only, so it never runs ahead of the bank. */
  currentAccount: '1020',
  cardMoney: '1030',
  transfersOnTheWay: '1040',
  membersOwe: '1100',
  membersInCredit: '2100',
  clubFunds: '3000',
  dues: '4000',
  courseFees: '4010',
  kits: '4020',
} as const;

/** One account of the books. */
@Entity()
@Unique('account_name_once', ['name'])
@Check('account_kind_known', `kind IN ('asset', 'liability', 'income', 'expense', 'equity')`)
export class Account {
  @PrimaryColumn('text')
  code: string;

  @Column('text')
  name: string;

  @Column('text')
  kind: AccountKind;

  /** May stand against a line of the bank statement that pays no invoice: bank charges, interest, cash paid in. */
  @Column('boolean', { default: false })
  settlesLines: boolean;
}
