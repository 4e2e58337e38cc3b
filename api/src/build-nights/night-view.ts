import type { BuildNightPlace } from './build-night-place.entity';
import type { NightRecord } from './build-nights.repository';
import type {
  BuildNightDetailDto,
  BuildNightDto,
  NightGuestDto,
  NightSeriesDto,
} from './dto/build-night.dto';
import { standingOf } from './standing.rules';

/** What the person who asks sees of a night in a list. */
export function buildNightDto(record: NightRecord, personId: string): BuildNightDto {
  const { night, benches, mentors, stages, places } = record;
  const { id, title, startsAt, endsAt, note, cancelledAt, cancelledReason } = night;
  const mentorIds = mentors.map((mentor) => mentor.personId);
  return {
    id,
    title,
    series: seriesDto(record),
    startsAt,
    endsAt,
    places: night.places,
    ...standingOf(places, mentorIds, personId),
    note,
    benches: benches.map(({ resource }) => ({ id: resource.id, tag: resource.tag })),
    mentors: mentors.map(({ person }) => ({ id: person.id, name: person.name })),
    stages: stages.map(({ stage }) => ({ id: stage.id, position: stage.position, name: stage.name })),
    cancelledAt,
    cancelledReason,
  };
}

/** The same with the names of who is coming and who waits. */
export function buildNightDetailDto(record: NightRecord, personId: string): BuildNightDetailDto {
  const guests = (state: BuildNightPlace['state']): NightGuestDto[] =>
    record.places
      .filter((place) => place.state === state)
      .map(({ person, saidAt }) => ({ id: person.id, name: person.name, saidAt }));
  return {
    ...buildNightDto(record, personId),
    comingPeople: guests('coming'),
    waitingPeople: guests('waiting'),
  };
}

function seriesDto({ night, seriesTotal }: NightRecord): NightSeriesDto | null {
  const { series, number } = night;
  if (!series || number === null) return null;
  return { id: series.id, title: series.title, rule: series.rule, number, total: seriesTotal };
}
