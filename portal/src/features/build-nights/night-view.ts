import { clubDay, wallOf } from '../../lib/club-time';
import type { BuildNight, CheckedNight } from './api/nights';

/** The series that carries the course: the longest of those in view. Its nights are called by their number. */
export function mainSeries(nights: readonly BuildNight[]): BuildNight['series'] {
  const all = nights.map(({ series }) => series).filter((series) => series !== null);
  return all.reduce<BuildNight['series']>(
    (longest, series) => (series.total > (longest?.total ?? 0) ? series : longest),
    null,
  );
}

/** 'Build night 15' for the course, else the night's own title. */
export function nightName(night: BuildNight, main: BuildNight['series']): string {
  return night.series && night.series.id === main?.id ? `Build night ${night.series.number}` : night.title;
}

type EntryLook = 'series' | 'one-off' | 'planned' | 'clash' | 'cancelled';

/** One entry of the month's grid. */
export interface Entry {
  id: string;
  /** Wall times of the club without an offset: the grid knows no zone. */
  start: string;
  end: string;
  look: EntryLook;
  night?: BuildNight;
  /** For what is only being planned. */
  title: string;
}

const two = (value: number): string => String(value).padStart(2, '0');

function wallText(instant: string): string {
  const { date, minute } = wallOf(instant);
  return `${date}T${two(Math.floor(minute / 60))}:${two(minute % 60)}`;
}

export const entryOf = (night: BuildNight): Entry => ({
  id: night.id,
  start: wallText(night.startsAt),
  end: wallText(night.endsAt),
  look: night.cancelledAt ? 'cancelled' : night.series ? 'series' : 'one-off',
  night,
  title: night.title,
});

/** Entries of nights that are being planned, dashed; those left out are not drawn. */
export const plannedEntries = (nights: readonly CheckedNight[], title: string): Entry[] =>
  nights
    .filter(({ verdict }) => verdict !== 'left out')
    .map((night) => ({
      id: `planned-${night.date}`,
      start: wallText(night.startsAt),
      end: wallText(night.endsAt),
      look: night.verdict === 'clash' ? 'clash' : 'planned',
      title: title.trim() || 'New night',
    }));

/** The night to open first: one that is on or next, else the last one shown. */
export function openFirst(nights: readonly BuildNight[], now: Date): BuildNight | undefined {
  const standing = nights.filter(({ cancelledAt }) => cancelledAt === null);
  return standing.find(({ endsAt }) => new Date(endsAt) > now) ?? standing[standing.length - 1];
}

export const isTonight = ({ startsAt }: BuildNight, now: Date): boolean => clubDay(startsAt) === clubDay(now);
