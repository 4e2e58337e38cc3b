import { IsWords, MayBeLeftOut } from '../../common/validators';

/** A word that goes with a stage to its mentor, or with a sign-off to the builder. */
export class StageNoteDto {
  /** @example Two turns off the output winding brought the gain down. */
  @MayBeLeftOut()
  @IsWords(1000, 0)
  note?: string;
}

/** What the builder should do before sending it again. */
export class SendBackDto {
  @IsWords(1000)
  note: string;
}
