import type { JsonFile } from '../common/json-file';
import type { CardFailure } from './cards';
import type { Charge, Intent, PaymentEvent, Payout, Refund, Session, Transaction } from './shapes';

/** What a session was opened for; the service keeps it but does not show it in the session itself. */
export interface Basket {
  id: string;
  lines: { name: string; quantity: number; unitMinor: number }[];
  intent: { description: string | null; metadata: Record<string, string>; receiptEmail: string | null };
}

export interface Delivery {
  id: string;
  attempts: number;
  nextAttemptAtMs: number;
  deliveredAtMs: number | null;
  lastAnswer: string | null;
}

/** A payment that the card's bank confirms or refuses later. */
export interface LatePayment {
  id: string;
  dueAtMs: number;
  failure?: CardFailure;
}

export interface KeptAnswer {
  id: string;
  request: string;
  keptAtMs: number;
  body: object;
}

/** Everything the stand-in knows, oldest first in every map. Maps, so that an id like `__proto__` finds nothing. */
export class Store {
  readonly sessions = new Map<string, Session>();
  readonly baskets = new Map<string, Basket>();
  readonly intents = new Map<string, Intent>();
  readonly charges = new Map<string, Charge>();
  readonly transactions = new Map<string, Transaction>();
  readonly refunds = new Map<string, Refund>();
  readonly payouts = new Map<string, Payout>();
  readonly events = new Map<string, PaymentEvent>();
  readonly deliveries = new Map<string, Delivery>();
  readonly latePayments = new Map<string, LatePayment>();
  readonly answers = new Map<string, KeptAnswer>();
  /** Transaction id and the payout that carried it to the bank. */
  readonly paidOut = new Map<string, { id: string; payout: string }>();

  constructor(private readonly file?: JsonFile) {
    const saved = file?.read();
    if (isSaved(saved)) Object.entries(this.maps()).forEach(([name, map]) => fill(map, saved[name]));
  }

  save(): void {
    const lists = Object.entries(this.maps()).map(([name, map]) => [name, [...map.values()]]);
    this.file?.write(Object.fromEntries(lists));
  }

  private maps(): Record<string, Map<string, { id: string }>> {
    const { sessions, baskets, intents, charges, transactions, refunds, payouts } = this;
    const { events, deliveries, latePayments, answers, paidOut } = this;
    const money = { sessions, baskets, intents, charges, transactions, refunds, payouts, paidOut };
    return { ...money, events, deliveries, latePayments, answers };
  }
}

export function put<T extends { id: string }>(map: Map<string, T>, item: T): T {
  map.set(item.id, item);
  return item;
}

const isSaved = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

function fill(map: Map<string, { id: string }>, items: unknown): void {
  if (Array.isArray(items)) items.filter(hasId).forEach((item) => map.set(item.id, item));
}

const hasId = (item: unknown): item is { id: string } => isSaved(item) && typeof item.id === 'string';
