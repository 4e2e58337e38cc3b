import type { Settings } from './settings';
import type { Store } from './store';
import type { EventType, PaymentEvent } from './shapes';

/** What the use cases need of the running service. */
export interface Context {
  settings: Settings;
  store: Store;
  /** Address of the hosted pages. */
  baseUrl(): string;
  /** Writes an event down and has it sent. */
  emit(type: EventType, object: PaymentEvent['data']['object']): void;
  confirmLater(sessionId: string): void;
}
