import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { Stage } from './stage.entity';

/** A point of the signal path with a planned level: one column of the level diagram. A stage may have none or two. */
@Entity()
@Unique('level_point_position_once', ['stageId', 'position'])
@Check('level_point_tolerance_positive', `tolerance_db > 0`)
@Check('level_point_limit_above_plan', `limit_dbm IS NULL OR limit_dbm > planned_dbm`)
export class LevelPoint {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => Stage, { nullable: false })
  @JoinColumn({ name: 'stage_id', foreignKeyConstraintName: 'level_point_of_stage' })
  stage: Relation<Stage>;

  /** Order within its stage, from 1. */
  @Column('integer')
  position: number;

  /** `Mixer` */
  @Column('text')
  name: string;

  /** `TP8` */
  @Column('text')
  testPoint: string;

  @Column('double precision')
  plannedDbm: number;

  @Column('double precision')
  toleranceDb: number;

  /** What the stage can deliver, or the next one can take; null where neither matters. */
  @Column('double precision', { nullable: true })
  limitDbm: number | null;
}
