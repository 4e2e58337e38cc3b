import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Invoice = components['schemas']['InvoiceDto'];
export type MyDues = components['schemas']['MyDuesDto'];
export type Payment = components['schemas']['PaymentDto'];
export type Receipt = components['schemas']['ReceiptDto'];
type CardPayment = components['schemas']['CardPaymentDto'];

export const DUES_KEY = ['dues'] as const;
const POLL_MS = 1000;

export const myInvoicesQuery = queryOptions({
  queryKey: [...DUES_KEY, 'invoices'],
  queryFn: () => unwrap(api.GET('/api/invoices/mine')),
});

export const myDuesQuery = queryOptions({
  queryKey: [...DUES_KEY, 'mine'],
  queryFn: () => unwrap(api.GET('/api/dues/mine')),
});

export const receiptQuery = (paymentId: string) =>
  queryOptions({
    queryKey: [...DUES_KEY, 'receipt', paymentId],
    queryFn: () => unwrap(api.GET('/api/receipts/{paymentId}', { params: { path: { paymentId } } })),
  });

const isUndecided = (payment: CardPayment | undefined): boolean =>
  payment?.state === 'open' || payment?.state === 'confirming';

/** After 1, 2, 4, 8, 16 and 32 seconds: a little over a minute in all. */
const MOST_ASKED = 6;

/**
 * What became of the visit to the card page: asked again, at growing distances, until it is known. `isGivenUp` when it
 * is still not after a minute; then only `useCardCheck` helps.
 */
export function useCardPayment(invoiceId: string) {
  const query = useQuery({
    queryKey: cardPaymentKey(invoiceId),
    queryFn: () =>
      unwrap(api.GET('/api/invoices/{invoiceId}/card-payment', { params: { path: { invoiceId } } })),
    staleTime: 0,
    refetchOnWindowFocus: false,
    refetchInterval: ({ state }) =>
      isUndecided(state.data) && timesAsked(state) <= MOST_ASKED
        ? POLL_MS * 2 ** (timesAsked(state) - 1)
        : false,
  });
  const state = useQueryClient().getQueryState<CardPayment>(cardPaymentKey(invoiceId));
  return { ...query, isGivenUp: isUndecided(query.data) && !!state && timesAsked(state) > MOST_ASKED };
}

const timesAsked = (state: { dataUpdateCount: number; errorUpdateCount: number }): number =>
  state.dataUpdateCount + state.errorUpdateCount;

const cardPaymentKey = (invoiceId: string) => [...DUES_KEY, 'card-payment', invoiceId];

/** Has the server ask the card service itself; its answer is what `useCardPayment` shows from then on. */
export function useCardCheck(invoiceId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      unwrap(api.POST('/api/invoices/{invoiceId}/card-payment/check', { params: { path: { invoiceId } } })),
    onSuccess: (payment) => client.setQueryData(cardPaymentKey(invoiceId), payment),
  });
}

/** Opens the card service's page in place of this one. */
export const useCheckout = (go: (url: string) => void = (url) => window.location.assign(url)) =>
  useMutation({
    mutationFn: (invoiceId: string) =>
      unwrap(api.POST('/api/invoices/{invoiceId}/checkout', { params: { path: { invoiceId } } })),
    onSuccess: ({ url }) => go(url),
  });
