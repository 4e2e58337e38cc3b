import { queryOptions, useMutation, useQuery } from '@tanstack/react-query';
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

/** What became of the visit to the card page; asked once a second until it is known. */
export const useCardPayment = (invoiceId: string) =>
  useQuery({
    queryKey: [...DUES_KEY, 'card-payment', invoiceId],
    queryFn: () =>
      unwrap(api.GET('/api/invoices/{invoiceId}/card-payment', { params: { path: { invoiceId } } })),
    staleTime: 0,
    refetchInterval: ({ state }) => (state.data === undefined || isUndecided(state.data) ? POLL_MS : false),
  });

/** Opens the card service's page in place of this one. */
export const useCheckout = (go: (url: string) => void = (url) => window.location.assign(url)) =>
  useMutation({
    mutationFn: (invoiceId: string) =>
      unwrap(api.POST('/api/invoices/{invoiceId}/checkout', { params: { path: { invoiceId } } })),
    onSuccess: ({ url }) => go(url),
  });
