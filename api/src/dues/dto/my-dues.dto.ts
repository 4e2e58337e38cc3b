import { PaymentDto } from './payment.dto';
import { TierDto } from './tier.dto';

/** For a transfer: what a member types into their bank's form. */
export class BankDetailsDto {
  accountName: string;
  accountNumber: string;
}

/** A member's own side of the club's books; their invoices are at /api/invoices/mine. */
export class MyDuesDto {
  tier: TierDto | null;
  currency: string;
  /** Left over from payments; used for the next invoice. */
  creditMinor: number;
  /** Latest first, those taken back left out. */
  payments: PaymentDto[];
  bank: BankDetailsDto;
  /** Who takes cash and cheques. */
  treasurerName: string;
  /** Writes to the treasurer go here; empty when the club has given no address. */
  contactEmail: string;
}
