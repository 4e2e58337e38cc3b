import { keepPreviousData, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

export type Summary = components['schemas']['TreasurySummaryDto'];
export type OpenInvoice = components['schemas']['OpenInvoiceDto'];
export type Statement = components['schemas']['StatementDto'];
export type StatementDetail = components['schemas']['StatementDetailDto'];
export type StatementLine = components['schemas']['StatementLineDto'];
export type BookItem = components['schemas']['BookItemDto'];
export type Totals = components['schemas']['TotalsDto'];
export type TakePayment = components['schemas']['TakePaymentDto'];
export type RaiseInvoice = components['schemas']['RaiseInvoiceDto'];
type MatchLine = components['schemas']['MatchLineDto'];

/** Everything of the treasury hangs together: what one act changes, all of it may show. */
export const TREASURY_KEY = ['treasury'] as const;
const OPEN_PER_PAGE = 25;

export const summaryQuery = queryOptions({
  queryKey: [...TREASURY_KEY, 'summary'],
  queryFn: () => unwrap(api.GET('/api/treasury/summary')),
});

export const openDuesQuery = (page: number, state: 'open' | 'late') =>
  queryOptions({
    queryKey: [...TREASURY_KEY, 'open', state, page],
    queryFn: () =>
      unwrap(api.GET('/api/invoices', { params: { query: { state, page, perPage: OPEN_PER_PAGE } } })),
    placeholderData: keepPreviousData,
  });

/** What one person has open, for the form that takes a payment. */
export const openOfPersonQuery = (personId: string) =>
  queryOptions({
    queryKey: [...TREASURY_KEY, 'open of', personId],
    queryFn: () =>
      unwrap(
        api.GET('/api/invoices', { params: { query: { state: 'open', personId, page: 1, perPage: 20 } } }),
      ),
    enabled: personId !== '',
  });

export const peopleQuery = queryOptions({
  queryKey: [...TREASURY_KEY, 'people'],
  queryFn: () => unwrap(api.GET('/api/people', { params: { query: { page: 1, perPage: 200 } } })),
});

export const statementsQuery = queryOptions({
  queryKey: [...TREASURY_KEY, 'statements'],
  queryFn: () =>
    unwrap(api.GET('/api/reconciliation/statements', { params: { query: { page: 1, perPage: 12 } } })),
});

export const statementQuery = (statementId: string) =>
  queryOptions({
    queryKey: [...TREASURY_KEY, 'statement', statementId],
    queryFn: () =>
      unwrap(api.GET('/api/reconciliation/statements/{statementId}', { params: { path: { statementId } } })),
  });

export function useTreasuryMutation<Input, Output>(mutationFn: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({ mutationFn, onSuccess: () => client.invalidateQueries({ queryKey: TREASURY_KEY }) });
}

export const useRaiseInvoice = () =>
  useTreasuryMutation((body: RaiseInvoice) => unwrap(api.POST('/api/invoices', { body })));

export const useTakePayment = () =>
  useTreasuryMutation((body: TakePayment) => unwrap(api.POST('/api/payments', { body })));

export const useTakeBackPayment = () =>
  useTreasuryMutation((paymentId: string) =>
    unwrap(api.POST('/api/payments/{paymentId}/take-back', { params: { path: { paymentId } } })),
  );

export const useImportStatement = () =>
  useTreasuryMutation((file: File) =>
    unwrap(
      api.POST('/api/statements', {
        body: { file: file.name },
        bodySerializer: () => {
          const form = new FormData();
          form.set('file', file, file.name);
          return form;
        },
      }),
    ),
  );

export const useMatchLine = () =>
  useTreasuryMutation(({ lineId, choice }: { lineId: string; choice: MatchLine }) =>
    unwrap(
      api.POST('/api/reconciliation/lines/{lineId}/match', { params: { path: { lineId } }, body: choice }),
    ),
  );

export const useTakeBackMatch = () =>
  useTreasuryMutation((lineId: string) =>
    unwrap(api.POST('/api/reconciliation/lines/{lineId}/take-back', { params: { path: { lineId } } })),
  );
