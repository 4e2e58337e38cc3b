import { ApiProperty } from '@nestjs/swagger';
import { IsIn } from 'class-validator';
import { CLUB_RULE_SETS, type ClubRuleSet } from '../club.entity';
import { OpenDayDto } from './opening-hours.dto';

/** What the sign-in page may know before anybody has signed in. */
export class ClubDto {
  /** @example Larkmoor Radio Builders */
  name: string;
  /** @example Millbeck Hall, Larkmoor */
  address: string;
  contactEmail: string;
  /** IANA zone of the club's wall clock. @example Europe/London */
  timeZone: string;
  /** ISO 4217 @example GBP */
  currency: string;
  /** By which rules the calculators judge what may be sent. The licence and local rules decide. */
  @ApiProperty({ enum: CLUB_RULE_SETS })
  ruleSet: ClubRuleSet;
  /** The days on which the workshop is open, Monday first; empty when the club gives no hours. */
  openingHours: OpenDayDto[];
  /** Accounts of the demo club; empty anywhere else. */
  demoAccounts: DemoAccountDto[];
}

export class DemoAccountDto {
  email: string;
  role: string;
}

/** The rules an organiser chooses for the club. */
export class ChooseRulesDto {
  @IsIn(CLUB_RULE_SETS)
  ruleSet: ClubRuleSet;
}
