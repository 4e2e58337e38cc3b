let zone = 'Europe/London';

/** The club's time zone, an IANA name; every formatter of an instant uses it unless told another. */
export const clubZone = (): string => zone;

/** Set once, when the club's settings arrive. */
export function setClubZone(name: string): void {
  zone = name;
}
