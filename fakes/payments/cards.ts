/** What a card does when it is used. `late` cards leave the payment unconfirmed for a while. */
export type CardOutcome =
  { kind: 'paid' } | { kind: 'declined'; failure: CardFailure } | { kind: 'late'; failure?: CardFailure };

export interface CardFailure {
  code: 'card_declined';
  declineCode: 'generic_decline' | 'insufficient_funds' | 'test_mode_live_card';
  message: string;
}

export interface TestCard {
  number: string;
  says: string;
  outcome: CardOutcome;
}

const failure = (declineCode: CardFailure['declineCode'], message: string): CardFailure => ({
  code: 'card_declined',
  declineCode,
  message,
});

const REFUSED = failure('generic_decline', 'Your card was declined.');
const NO_FUNDS = failure('insufficient_funds', 'Your card has insufficient funds.');
const NOT_A_TEST_CARD = failure('test_mode_live_card', 'Only the test numbers listed below work here.');

/** The first three are the hosted service's own published test numbers; the two slow ones are ours. */
export const TEST_CARDS: readonly TestCard[] = [
  { number: '4242424242424242', says: 'pays at once', outcome: { kind: 'paid' } },
  { number: '4000000000000002', says: 'is declined', outcome: { kind: 'declined', failure: REFUSED } },
  {
    number: '4000000000009995',
    says: 'is declined for want of funds',
    outcome: { kind: 'declined', failure: NO_FUNDS },
  },
  { number: '4000000000001018', says: 'pays, but is confirmed late', outcome: { kind: 'late' } },
  {
    number: '4000000000002024',
    says: 'fails, and that is known late',
    outcome: { kind: 'late', failure: REFUSED },
  },
];

export const outcomeOf = (number: string): CardOutcome =>
  TEST_CARDS.find((card) => card.number === number)?.outcome ?? {
    kind: 'declined',
    failure: NOT_A_TEST_CARD,
  };

/** The digits of a typed card number, or undefined when it cannot be one (length and check digit of ISO/IEC 7812-1). */
export function readCardNumber(typed: string): string | undefined {
  const digits = typed.replace(/[ -]/g, '');
  return /^\d{12,19}$/.test(digits) && luhnSum(digits) % 10 === 0 ? digits : undefined;
}

function luhnSum(digits: string): number {
  return [...digits].reverse().reduce((sum, digit, place) => {
    const value = place % 2 === 0 ? Number(digit) : Number(digit) * 2;
    return sum + (value > 9 ? value - 9 : value);
  }, 0);
}
