import { ArrayMinSize, Matches } from 'class-validator';
import { AreIds, IsId, IsWords, MayBeLeftOut } from '../../common/validators';

/** What the line stands for: invoices it pays, a payment written down before, or an account. One of the three. */
export class MatchLineDto {
  /** Of one person; paid in this order, and what is left over is credit on account. */
  @MayBeLeftOut()
  @ArrayMinSize(1)
  @AreIds(20)
  invoiceIds?: string[];

  /** A transfer or cheque of exactly the line's amount. */
  @MayBeLeftOut()
  @IsId()
  paymentId?: string;

  /** @example 5000 */
  @MayBeLeftOut()
  @Matches(/^\d{4}$/, { message: '$property is a code of four figures, such as 5000' })
  accountCode?: string;

  /** What it was, for the books. */
  @MayBeLeftOut()
  @IsWords(200)
  note?: string;
}
