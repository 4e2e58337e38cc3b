import { IsIn, IsInt, Max, Min } from 'class-validator';
import { PageQueryDto } from '../../common/paging.dto';
import { IsDay, IsId, IsWords, MayBeLeftOut } from '../../common/validators';
import { daysLate, openOf, stateOf, type InvoiceState } from '../dues.rules';
import { INVOICE_KINDS, type InvoiceKind } from '../invoice.entity';
import type { InvoiceRow } from '../invoices.repository';
import { printReference } from '../../common/creditor-reference.rules';

export class RaiseInvoiceDto {
  @IsId()
  personId: string;

  @IsIn(INVOICE_KINDS)
  kind: InvoiceKind;

  /** @example Dues, October to December */
  @IsWords(120)
  description: string;

  @IsInt()
  @Min(1)
  @Max(10_000_000)
  amountMinor: number;

  /** Not before today. */
  @IsDay()
  dueOn: string;
}

export const INVOICE_FILTERS = ['open', 'late', 'paid'] as const;
export type InvoiceFilter = (typeof INVOICE_FILTERS)[number];

export class ListInvoicesQueryDto extends PageQueryDto {
  /** `open`: anything left to pay, late or not. */
  @MayBeLeftOut()
  @IsIn(INVOICE_FILTERS)
  state?: InvoiceFilter;

  @MayBeLeftOut()
  @IsId()
  personId?: string;
}

export class InvoiceDto {
  id: string;
  /** @example D-0412 */
  number: string;
  kind: InvoiceKind;
  description: string;
  amountMinor: number;
  paidMinor: number;
  /** Left to pay. */
  openMinor: number;
  issuedOn: string;
  dueOn: string;
  state: InvoiceState;
  /** Days past the due day; 0 unless late. */
  daysLate: number;
  /** ISO 11649, without spaces. @example RF43LRBD0421 */
  reference: string;
  /** The same in fours, as it is printed. @example RF43 LRBD 0421 */
  referencePrinted: string;
}

export class OpenInvoiceDto extends InvoiceDto {
  personId: string;
  personName: string;
}

export class InvoicesPageDto {
  items: OpenInvoiceDto[];
  total: number;
  /** Left to pay on all that match, not on this page alone. */
  openMinor: number;
  page: number;
  perPage: number;
}

export function invoiceDto(invoice: InvoiceRow, today: string): InvoiceDto {
  const { id, number, kind, description, amountMinor, paidMinor, issuedOn, dueOn, reference } = invoice;
  return {
    id,
    number,
    kind,
    description,
    amountMinor,
    paidMinor,
    openMinor: openOf(invoice),
    issuedOn,
    dueOn,
    state: stateOf(invoice, today),
    daysLate: daysLate(invoice, today),
    reference,
    referencePrinted: printReference(reference),
  };
}
