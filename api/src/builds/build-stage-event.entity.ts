import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { Person } from '../people/person.entity';
import { BuildStage } from './build-stage.entity';

export const STAGE_EVENT_KINDS = ['sent', 'withdrawn', 'sent back', 'signed off'] as const;
export type StageEventKind = (typeof STAGE_EVENT_KINDS)[number];

/** Who moved a stage on, when, and with which word. Never changed and never deleted. */
@Entity()
@Unique('build_stage_event_position_once', ['buildId', 'stageId', 'position'])
@Index('build_stage_event_latest', ['kind', 'at'])
@Check('build_stage_event_kind_known', `kind IN ('sent', 'withdrawn', 'sent back', 'signed off')`)
@Check('build_stage_event_word_given', `kind <> 'sent back' OR length(btrim(note)) > 0`)
export class BuildStageEvent {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  buildId: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => BuildStage, { nullable: false })
  @JoinColumn([
    {
      name: 'build_id',
      referencedColumnName: 'buildId',
      foreignKeyConstraintName: 'build_stage_event_of_stage',
    },
    {
      name: 'stage_id',
      referencedColumnName: 'stageId',
      foreignKeyConstraintName: 'build_stage_event_of_stage',
    },
  ])
  buildStage: Relation<BuildStage>;

  /** Order within its stage, from 1. */
  @Column('integer')
  position: number;

  @Column('text')
  kind: StageEventKind;

  @Column('uuid')
  byPersonId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'by_person_id', foreignKeyConstraintName: 'build_stage_event_by_person' })
  byPerson: Relation<Person>;

  @Column('timestamptz')
  at: Date;

  @Column('text', { default: '' })
  note: string;
}
