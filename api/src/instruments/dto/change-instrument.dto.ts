import { IsIn } from 'class-validator';
import { IsDay, IsWords } from '../../common/validators';
import { CONDITIONS, type Condition } from '../instrument.entity';

export class ChangeConditionDto {
  @IsIn(CONDITIONS)
  condition: Condition;

  /** What is wrong, or what was put right; members read it. */
  @IsWords(500)
  note: string;
}

export class ChangeCalibrationDto {
  /** Last day on which the calibration holds. */
  @IsDay()
  dueOn: string;

  /** Who calibrated it, and what it came out at. */
  @IsWords(500)
  note: string;
}
