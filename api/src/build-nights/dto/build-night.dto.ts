export class NightPersonDto {
  id: string;
  /** @example Tamsin Ardley */
  name: string;
}

export class NightBenchDto {
  id: string;
  /** @example Bench 3 */
  tag: string;
}

export class NightStageDto {
  id: string;
  /** @example 9 */
  position: number;
  /** @example Pre-driver */
  name: string;
}

export class NightSeriesDto {
  id: string;
  /** @example Larkmoor Twenty */
  title: string;
  /** @example FREQ=WEEKLY;COUNT=22 */
  rule: string;
  /** This night's place in the series, from 1. */
  number: number;
  /** How many nights the series has. */
  total: number;
}

/** How the person who asks stands to the night. */
export class NightStandingDto {
  state: 'coming' | 'waiting' | 'on duty';
  /** Place in the waiting list, 1 is next; null unless waiting. */
  line: number | null;
}

export class BuildNightDto {
  id: string;
  title: string;
  series: NightSeriesDto | null;
  startsAt: Date;
  endsAt: Date;
  places: number;
  /** How many are coming. */
  coming: number;
  /** How many wait for a place. */
  waiting: number;
  note: string;
  benches: NightBenchDto[];
  mentors: NightPersonDto[];
  stages: NightStageDto[];
  /** null: not said anything. */
  mine: NightStandingDto | null;
  cancelledAt: Date | null;
  cancelledReason: string | null;
}

export class NightGuestDto extends NightPersonDto {
  /** When they said that they are coming. */
  saidAt: Date;
}

export class BuildNightDetailDto extends BuildNightDto {
  /** In the order in which they said so. */
  comingPeople: NightGuestDto[];
  /** In the order in which they move up. */
  waitingPeople: NightGuestDto[];
}

export class BuildNightsDto {
  items: BuildNightDto[];
}
