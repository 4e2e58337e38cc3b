import { BuildNightDto } from './build-night.dto';

/** One thing that is taken. */
export class NightClashDto {
  kind: 'bench' | 'mentor';
  /** @example Bench 1 is taken by Vector clearance, 19:00 to 21:00. */
  detail: string;
}

/** What would make the night clear, as `instead` takes it; empty when only leaving it out helps. */
export class NightRemedyDto {
  benchIds?: string[];
  mentorIds?: string[];
}

export class CheckedNightDto {
  /** The night's day on the club's calendar. @example 2026-10-20 */
  date: string;
  startsAt: Date;
  endsAt: Date;
  verdict: 'clear' | 'clash' | 'left out';
  clashes: NightClashDto[];
  remedy: NightRemedyDto;
}

export class NightsPreviewDto {
  nights: CheckedNightDto[];
  /** How many people would be told by mail. */
  toTell: number;
}

export class ScheduledNightsDto {
  nights: BuildNightDto[];
  /** How many people are told by mail. */
  told: number;
}
