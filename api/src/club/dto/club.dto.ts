/** What the sign-in page may know before anybody has signed in. */
export class ClubDto {
  /** @example Larkmoor Radio Builders */
  name: string;
  /** @example Millbeck Hall, Larkmoor */
  address: string;
  contactEmail: string;
  /** IANA zone of the club's wall clock. @example Europe/London */
  timeZone: string;
  /** ISO 4217 @example GBP */
  currency: string;
  /** Accounts of the demo club; empty anywhere else. */
  demoAccounts: DemoAccountDto[];
}

export class DemoAccountDto {
  email: string;
  role: string;
}
