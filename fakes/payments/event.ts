import { newId, nowSeconds } from './ids';
import type { EventType, PaymentEvent } from './shapes';

/** The protocol version whose shapes we answer with, the one the SDK 23 asks for. */
const API_VERSION = '2026-10-28.endive';

/** Holds the object as it was at that moment, whatever happens to it later. */
export const newEvent = (type: EventType, object: PaymentEvent['data']['object']): PaymentEvent => ({
  id: newId('evt'),
  object: 'event',
  api_version: API_VERSION,
  created: nowSeconds(),
  data: { object: structuredClone(object) },
  livemode: false,
  pending_webhooks: 1,
  request: null,
  type,
});
