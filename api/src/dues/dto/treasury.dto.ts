import type { Age } from '../dues.rules';

export class AgeBandDto {
  age: Age;
  count: number;
  openMinor: number;
}

/** The newest run of dues: the invoices raised in the same words, at most half a year apart. */
export class DuesRunDto {
  /** @example Dues, October to December */
  description: string;
  /** The last due day among them. */
  dueOn: string;
  raisedMinor: number;
  paidMinor: number;
  count: number;
  paidCount: number;
}

/** Where the club's money is, by the books. */
export class HoldingsDto {
  currentAccountMinor: number;
  /** Into the current account in the running month. */
  inThisMonthMinor: number;
  /** Out of it; nothing or less than nothing. */
  outThisMonthMinor: number;
  cashBoxMinor: number;
  chequesInHandMinor: number;
  /** Paid by card, not yet at the bank. */
  cardMoneyMinor: number;
  /** Transfers written down that no statement has shown yet. */
  transfersOnTheWayMinor: number;
}

/** Something the card service told us that was not acted on. */
export class CardNoteDto {
  id: string;
  receivedAt: string;
  note: string;
}

export class TreasurySummaryDto {
  /** The instant these figures are of. */
  asOf: string;
  today: string;
  currency: string;
  /** Null until dues are raised. */
  dues: DuesRunDto | null;
  holdings: HoldingsDto;
  aged: AgeBandDto[];
  openCount: number;
  openMinor: number;
  lateMinor: number;
  /** People with something late. */
  latePeople: number;
  /** Owed to members: what their payments left over. */
  creditMinor: number;
  cardNotes: CardNoteDto[];
}
