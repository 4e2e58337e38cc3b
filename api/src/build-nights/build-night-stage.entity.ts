import { Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Stage } from '../plans/stage.entity';
import { BuildNight } from './build-night.entity';

/** A stage of the plan the night is about. */
@Entity()
export class BuildNightStage {
  @PrimaryColumn('uuid')
  nightId: string;

  @PrimaryColumn('uuid')
  stageId: string;

  @ManyToOne(() => BuildNight, { nullable: false })
  @JoinColumn({ name: 'night_id', foreignKeyConstraintName: 'build_night_stage_of_night' })
  night: Relation<BuildNight>;

  @ManyToOne(() => Stage, { nullable: false })
  @JoinColumn({ name: 'stage_id', foreignKeyConstraintName: 'build_night_stage_exists' })
  stage: Relation<Stage>;
}
