import { IsIn, IsInt, Max, Min } from 'class-validator';
import { PageQueryDto } from '../../common/paging.dto';
import { AreIds, IsDay, IsId, IsWords, MayBeLeftOut } from '../../common/validators';
import { METHODS, type Method } from '../payment.entity';

/** Ways of paying that are handed to the treasurer; a card pays on the card service's page. */
export const TAKEN_METHODS = ['cash', 'cheque', 'transfer'] as const;
export type TakenMethod = (typeof TAKEN_METHODS)[number];

export class TakePaymentDto {
  @IsId()
  personId: string;

  @IsIn(TAKEN_METHODS)
  method: TakenMethod;

  @IsInt()
  @Min(1)
  @Max(10_000_000)
  amountMinor: number;

  /** Today or before. */
  @IsDay()
  receivedOn: string;

  /** Paid in this order; what is left over is credit on account. */
  @AreIds(20)
  invoiceIds: string[];

  @MayBeLeftOut()
  @IsWords(200)
  note?: string;

  /** Chosen once by the form: the same key again answers with the payment already taken. */
  @IsId()
  clientKey: string;
}

export class ListPaymentsQueryDto extends PageQueryDto {
  @MayBeLeftOut()
  @IsId()
  personId?: string;

  @MayBeLeftOut()
  @IsIn(METHODS)
  method?: Method;
}

export class PaidShareDto {
  invoiceId: string;
  invoiceNumber: string;
  description: string;
  amountMinor: number;
}

export class PaymentDto {
  id: string;
  /** @example R-0298 */
  receiptNumber: string;
  personId: string;
  personName: string;
  method: Method;
  amountMinor: number;
  receivedOn: string;
  note: string;
  /** A transfer or cheque that no line of a statement has shown yet. */
  isBeingMatched: boolean;
  isTakenBack: boolean;
  paid: PaidShareDto[];
  /** Left over for later invoices. */
  creditMinor: number;
}

export class PaymentsPageDto {
  items: PaymentDto[];
  total: number;
  page: number;
  perPage: number;
}

export class ReceiptDto extends PaymentDto {
  clubName: string;
  clubAddress: string;
  currency: string;
  /** Who took it; a treasurer of the club where a machine did. */
  treasurerName: string;
}
