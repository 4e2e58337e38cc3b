import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Person } from '../people/person.entity';
import { PlanCheck } from '../plans/plan-check.entity';
import { BuildStage } from './build-stage.entity';

/** A check ticked, a safety check acknowledged, or what a mentor saw: by whom and when. Taking it back leaves it in the record. */
@Entity()
@Index('check_mark_once', ['buildId', 'checkId'], { unique: true, where: 'taken_back_at IS NULL' })
@Check('check_mark_times_in_order', `taken_back_at IS NULL OR taken_back_at >= at`)
export class CheckMark {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  buildId: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => BuildStage, { nullable: false })
  @JoinColumn([
    { name: 'build_id', referencedColumnName: 'buildId', foreignKeyConstraintName: 'check_mark_of_stage' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'check_mark_of_stage' },
  ])
  buildStage: Relation<BuildStage>;

  @Column('uuid')
  checkId: string;

  @ManyToOne(() => PlanCheck, { nullable: false })
  @JoinColumn([
    { name: 'check_id', referencedColumnName: 'id', foreignKeyConstraintName: 'check_mark_of_check' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'check_mark_of_check' },
  ])
  check: Relation<PlanCheck>;

  @Column('uuid')
  byPersonId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'by_person_id', foreignKeyConstraintName: 'check_mark_by_person' })
  byPerson: Relation<Person>;

  @Column('timestamptz')
  at: Date;

  @Column('timestamptz', { nullable: true })
  takenBackAt: Date | null;
}
