import { IsInt, Max, Min } from 'class-validator';
import { AreIds, IsInstant, IsWords, MayBeLeftOut } from '../../common/validators';
import { MOST } from './night-fields';

/** What is to be different about one night; what is left out stays. */
export class ChangeNightDto {
  @MayBeLeftOut()
  @IsWords(80)
  title?: string;

  /** Not fewer than are coming. More moves the waiting list up. */
  @MayBeLeftOut()
  @IsInt()
  @Min(1)
  @Max(MOST.places)
  places?: number;

  @MayBeLeftOut()
  @IsWords(MOST.note, 0)
  note?: string;

  @MayBeLeftOut()
  @IsInstant()
  startsAt?: string;

  @MayBeLeftOut()
  @IsInstant()
  endsAt?: string;

  @MayBeLeftOut()
  @AreIds(MOST.benches)
  benchIds?: string[];

  @MayBeLeftOut()
  @AreIds(MOST.mentors)
  mentorIds?: string[];

  @MayBeLeftOut()
  @AreIds(MOST.stages)
  stageIds?: string[];
}

/** Why it does not take place; the word goes to everybody who was coming. */
export class CancelNightDto {
  /** @example The hall has no heating this week. */
  @IsWords(300)
  reason: string;
}
