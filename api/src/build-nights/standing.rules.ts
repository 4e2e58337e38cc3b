import type { BuildNightPlace } from './build-night-place.entity';
import type { NightStandingDto } from './dto/build-night.dto';

type Place = Pick<BuildNightPlace, 'personId' | 'state' | 'turn'>;

export interface Standing {
  coming: number;
  waiting: number;
  mine: NightStandingDto | null;
}

/** How many are coming and waiting, and how one person stands to it. */
export function standingOf(
  places: readonly Place[],
  mentorIds: readonly string[],
  personId: string,
): Standing {
  const waiting = places.filter(({ state }) => state === 'waiting').sort((a, b) => a.turn - b.turn);
  const own = places.find((place) => place.personId === personId);
  return {
    coming: places.length - waiting.length,
    waiting: waiting.length,
    mine: mentorIds.includes(personId)
      ? { state: 'on duty', line: null }
      : ((own && said(own, waiting)) ?? null),
  };
}

function said(own: Place, waiting: readonly Place[]): NightStandingDto {
  if (own.state === 'coming') return { state: 'coming', line: null };
  return { state: 'waiting', line: waiting.findIndex(({ turn }) => turn === own.turn) + 1 };
}
