import { defineProblems } from '../common/domain-error';

export const duesProblems = defineProblems({
  'invoice-paid': { status: 409, title: 'Nothing is open on this invoice' },
  'card-payment-under-way': { status: 409, title: 'A card payment is being confirmed' },
  'card-page-unavailable': { status: 409, title: 'The card page cannot be opened' },
  'card-service-silent': { status: 409, title: 'The card service does not answer' },
  'webhook-not-believed': { status: 400, title: 'The event is not signed as it should be' },
  'payment-key-used': { status: 409, title: 'This form has taken another payment' },
  'payment-taken-back-before': { status: 409, title: 'The payment was taken back before' },
  'payment-not-yours-to-take-back': { status: 409, title: 'The payment cannot be taken back here' },
  'tier-name-taken': { status: 409, title: 'There is a tier of that name' },
});
