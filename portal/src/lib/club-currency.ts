let code = 'GBP';

/** The club's currency, ISO 4217; every formatter of money uses it unless told another. */
export const clubCurrency = (): string => code;

/** Set once, when the club's settings arrive. */
export function setClubCurrency(currency: string): void {
  code = currency;
}
