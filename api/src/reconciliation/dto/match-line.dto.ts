import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsArray,
  IsOptional,
  IsUUID,
  Matches,
} from 'class-validator';
import { IsWords } from '../../common/validators';

/** What the line stands for: invoices it pays, a payment written down before, or an account. One of the three. */
export class MatchLineDto {
  /** Of one person; paid in this order, and what is left over is credit on account. */
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(20)
  @ArrayUnique()
  @IsUUID(undefined, { each: true })
  invoiceIds?: string[];

  /** A transfer or cheque of exactly the line's amount. */
  @IsOptional()
  @IsUUID()
  paymentId?: string;

  /** @example 5000 */
  @IsOptional()
  @Matches(/^\d{4}$/, { message: '$property is a code of four figures, such as 5000' })
  accountCode?: string;

  /** What it was, for the books. */
  @IsOptional()
  @IsWords(200)
  note?: string;
}
