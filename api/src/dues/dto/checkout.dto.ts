export class CheckoutDto {
  /** The card service's page; the browser goes there. */
  url: string;
}

export const CARD_STATES = ['none', 'open', 'confirming', 'paid', 'failed', 'expired'] as const;
export type CardState = (typeof CARD_STATES)[number];

export class CardPaymentDto {
  /**
   * `open`: the page was opened and nothing has come from it yet; `confirming`: the card was taken, the bank has yet
   * to confirm; `failed`: no money was taken.
   */
  state: CardState;
  /** Left to pay on the invoice now. */
  openMinor: number;
  /** The receipt, once it is paid. */
  receiptId: string | null;
}
