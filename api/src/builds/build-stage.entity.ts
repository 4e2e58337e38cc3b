import { Check, Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Stage } from '../plans/stage.entity';
import { Build } from './build.entity';

export const KEPT_STAGE_STATES = [
  'not started',
  'on the bench',
  'with mentor',
  'sent back',
  'signed off',
] as const;

/** What is kept of a stage's state. *Locked* is not kept: it follows from the stages before. */
export type KeptStageState = (typeof KEPT_STAGE_STATES)[number];

/** A stage of somebody's build. Its state moves by events; a deferred trigger holds the two together. */
@Entity()
@Index('build_stage_with_mentor', ['state'], { where: `state = 'with mentor'` })
@Check(
  'build_stage_state_known',
  `state IN ('not started', 'on the bench', 'with mentor', 'sent back', 'signed off')`,
)
export class BuildStage {
  @PrimaryColumn('uuid')
  buildId: string;

  @ManyToOne(() => Build, { nullable: false })
  @JoinColumn({ name: 'build_id', foreignKeyConstraintName: 'build_stage_of_build' })
  build: Relation<Build>;

  @PrimaryColumn('uuid')
  stageId: string;

  @ManyToOne(() => Stage, { nullable: false })
  @JoinColumn({ name: 'stage_id', foreignKeyConstraintName: 'build_stage_of_stage' })
  stage: Relation<Stage>;

  @Column('text', { default: 'not started' })
  state: KeptStageState;
}
