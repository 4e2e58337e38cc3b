import type { Clash, Span } from '../bookings/bookings.service';
import { hoursWords, timeWords } from '../common/wall-clock';
import type { CheckedNightDto, NightClashDto, NightRemedyDto } from './dto/planned-nights.dto';
import { listText } from './night-words.rules';
import type { WantedNight } from './plan.rules';

/** A mentor who is on duty elsewhere during one of the wanted nights. */
export interface Duty extends Span {
  spanIndex: number;
  personId: string;
  personName: string;
  /** Of the other night. */
  title: string;
}

/** What there is at the time of the wanted nights, and what of it is taken. */
export interface Surroundings {
  zone: string;
  /** Every bench of the club, in the order of the page. */
  benchIds: readonly string[];
  /** Everybody who may be on duty. */
  mentorIds: readonly string[];
  taken: readonly Clash[];
  duties: readonly Duty[];
}

/** Each wanted night with its verdict, and with what would make it clear. */
export function checkNights(nights: readonly WantedNight[], surroundings: Surroundings): CheckedNightDto[] {
  return nights.map((night, index) => {
    const { date, startsAt, endsAt, isLeftOut } = night;
    const taken = surroundings.taken.filter(({ spanIndex }) => spanIndex === index);
    const duties = surroundings.duties.filter(({ spanIndex }) => spanIndex === index);
    const found = isLeftOut ? [] : clashesOf(night, taken, duties, surroundings.zone);
    const verdict = isLeftOut ? 'left out' : found.length > 0 ? 'clash' : 'clear';
    const remedy = isLeftOut ? {} : remedyOf(night, taken, duties, surroundings);
    return { date, startsAt, endsAt, verdict, clashes: found, remedy };
  });
}

function clashesOf(
  { benchIds, mentorIds }: WantedNight,
  taken: readonly Clash[],
  duties: readonly Duty[],
  zone: string,
): NightClashDto[] {
  const benches = taken.filter(({ resourceId }) => benchIds.includes(resourceId));
  const bookingIds = new Set(benches.map(({ bookingId }) => bookingId));
  return [
    ...[...bookingIds].map((id) =>
      benchClash(
        benches.filter(({ bookingId }) => bookingId === id),
        zone,
      ),
    ),
    ...duties.filter(({ personId }) => mentorIds.includes(personId)).map((duty) => mentorClash(duty, zone)),
  ];
}

function benchClash(clashes: readonly Clash[], zone: string): NightClashDto {
  const [first] = clashes;
  if (!first) throw new Error('a clash has a bench');
  const benches = listText(clashes.map(({ resourceTag }) => resourceTag));
  const verb = clashes.length === 1 ? 'is' : 'are';
  const by = first.kind === 'session' ? `booked by ${first.personName}` : `taken by ${first.title}`;
  return { kind: 'bench', detail: `${benches} ${verb} ${by}, ${hoursWords(first, zone)}.` };
}

function mentorClash({ personName, title, endsAt }: Duty, zone: string): NightClashDto {
  return { kind: 'mentor', detail: `${personName} is on ${title} until ${timeWords(endsAt, zone)}.` };
}

function remedyOf(
  { benchIds, mentorIds }: WantedNight,
  taken: readonly Clash[],
  duties: readonly Duty[],
  { benchIds: allBenches, mentorIds: allMentors }: Surroundings,
): NightRemedyDto {
  const busyBenches = new Set(taken.map(({ resourceId }) => resourceId));
  const busyMentors = new Set(duties.map(({ personId }) => personId));
  const benches = freed(benchIds, busyBenches, allBenches);
  const mentors = freed(mentorIds, busyMentors, allMentors);
  return { ...(benches && { benchIds: benches }), ...(mentors && { mentorIds: mentors }) };
}

/** The wanted ones that are free, filled up with others that are; nothing when all are free or none can be had. */
function freed(
  wanted: readonly string[],
  busy: ReadonlySet<string>,
  all: readonly string[],
): string[] | undefined {
  const kept = wanted.filter((id) => !busy.has(id));
  if (kept.length === wanted.length) return undefined;
  const others = all.filter((id) => !busy.has(id) && !wanted.includes(id));
  const chosen = new Set([...kept, ...others.slice(0, wanted.length - kept.length)]);
  return chosen.size > 0 ? all.filter((id) => chosen.has(id)) : undefined;
}
