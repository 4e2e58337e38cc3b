import { queryOptions, useQuery } from '@tanstack/react-query';
import { setClubCurrency } from '../lib/club-currency';
import { setClubZone } from '../lib/club-zone';
import { api, unwrap } from './client';
import type { components } from './schema';

export type Club = components['schemas']['ClubDto'];

async function getClub(): Promise<Club> {
  const club = await unwrap(api.GET('/api/club'));
  setClubZone(club.timeZone);
  setClubCurrency(club.currency);
  return club;
}

/** The club's public name, zone and currency; it hardly ever changes. */
const clubQuery = queryOptions({ queryKey: ['club'], queryFn: getClub, staleTime: Infinity });

export const useClub = () => useQuery(clubQuery);

const NO_HOURS: Club['openingHours'] = [];

/** When the workshop is open; empty while it is not known, or when the club gives no hours. */
export const useOpeningHours = (): Club['openingHours'] => useClub().data?.openingHours ?? NO_HOURS;
