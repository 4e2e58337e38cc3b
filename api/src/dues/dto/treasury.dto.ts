import type { Age } from '../dues.rules';

export class AgeBandDto {
  age: Age;
  count: number;
  openMinor: number;
}

/** Invoices with a due day in the running calendar quarter. */
export class QuarterDto {
  from: string;
  to: string;
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
  dues: QuarterDto;
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
