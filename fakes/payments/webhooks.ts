import type { Settings } from './settings';
import type { PaymentEvent } from './shapes';
import { signatureHeader } from './signature';
import { nowSeconds } from './ids';
import { type Delivery, put, type Store } from './store';

const ATTEMPT_TIMEOUT_MS = 10_000;
const LONGEST_WAIT_MS = 60_000;

/** Posts events, in the order they happened, until each was answered with 2xx; the wait doubles after each failure. */
export class Webhooks {
  private url: string | undefined;
  private paused = false;
  private sending = false;
  private timer?: NodeJS.Timeout;
  private readonly stopped = new AbortController();

  constructor(
    private readonly store: Store,
    private readonly settings: Settings,
  ) {
    this.url = settings.webhookUrl;
  }

  add(event: PaymentEvent): void {
    put(this.store.events, event);
    const fresh = { attempts: 0, nextAttemptAtMs: Date.now(), deliveredAtMs: null, lastAnswer: null };
    put(this.store.deliveries, { id: event.id, ...fresh });
    this.wakeIn(0);
  }

  pause(): void {
    this.paused = true;
  }

  resume(): void {
    this.paused = false;
    this.wakeIn(0);
  }

  sendTo(url: string | undefined): void {
    this.url = url;
    this.wakeIn(0);
  }

  status() {
    return { paused: this.paused, webhookUrl: this.url ?? null };
  }

  waiting(): Delivery[] {
    return [...this.store.deliveries.values()].filter((delivery) => delivery.deliveredAtMs === null);
  }

  stop(): void {
    clearTimeout(this.timer);
    this.stopped.abort();
  }

  /** One attempt now, paused or not, delivered before or not. */
  async send(event: PaymentEvent): Promise<Delivery> {
    const delivery = this.store.deliveries.get(event.id);
    if (!delivery) throw new Error(`no delivery is kept for ${event.id}`);
    const answer = await this.post(event);
    if (this.stopped.signal.aborted) return delivery;
    note(delivery, answer, this.settings.retryFirstMs);
    if (delivery.deliveredAtMs !== null) event.pending_webhooks = 0;
    this.store.save();
    return delivery;
  }

  private wakeIn(ms: number): void {
    clearTimeout(this.timer);
    if (this.stopped.signal.aborted) return;
    const send = (): void => void this.sendDue().catch((error: unknown) => console.error(error));
    this.timer = setTimeout(send, ms);
  }

  private async sendDue(): Promise<void> {
    if (this.sending) return;
    this.sending = true;
    try {
      for (let event = this.nextDue(); event; event = this.nextDue()) await this.send(event);
    } finally {
      // Whatever went wrong with one event, the next wake-up goes on.
      this.sending = false;
      this.wakeForNext();
    }
  }

  private wakeForNext(): void {
    const next = Math.min(...this.waiting().map((delivery) => delivery.nextAttemptAtMs));
    if (this.canSend() && Number.isFinite(next)) this.wakeIn(Math.max(0, next - Date.now()));
  }

  private nextDue(): PaymentEvent | undefined {
    if (!this.canSend()) return undefined;
    // The longest due goes first, so that an event that keeps failing never holds up the others.
    const [first] = this.waiting().sort((one, other) => one.nextAttemptAtMs - other.nextAttemptAtMs);
    return first && first.nextAttemptAtMs <= Date.now() ? this.store.events.get(first.id) : undefined;
  }

  private canSend(): boolean {
    return !this.paused && this.url !== undefined && !this.stopped.signal.aborted;
  }

  private async post(event: PaymentEvent): Promise<{ ok: boolean; words: string }> {
    if (this.url === undefined) return { ok: false, words: 'no webhook address is set' };
    const payload = JSON.stringify(event);
    try {
      const response = await fetch(this.url, {
        method: 'POST',
        body: payload,
        redirect: 'manual',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          // Signed afresh for each attempt: receivers refuse a signature of more than a few minutes' age.
          'stripe-signature': signatureHeader(payload, this.settings.webhookSecret, nowSeconds()),
        },
        signal: AbortSignal.any([AbortSignal.timeout(ATTEMPT_TIMEOUT_MS), this.stopped.signal]),
      });
      await response.body?.cancel();
      return { ok: response.ok, words: `HTTP ${response.status}` };
    } catch (error) {
      return { ok: false, words: error instanceof Error ? error.message : String(error) };
    }
  }
}

function note(delivery: Delivery, answer: { ok: boolean; words: string }, firstWaitMs: number): void {
  delivery.attempts += 1;
  delivery.lastAnswer = answer.words;
  const waitMs = Math.min(firstWaitMs * 2 ** (delivery.attempts - 1), LONGEST_WAIT_MS);
  delivery.nextAttemptAtMs = Date.now() + waitMs;
  if (answer.ok) delivery.deliveredAtMs = Date.now();
}
