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
import { InstrumentKind } from '../instruments/instrument-kind.entity';
import { LevelPoint } from './level-point.entity';
import { Stage } from './stage.entity';

export const CHECK_KINDS = ['tick', 'measure', 'photo', 'safety', "mentor's eyes"] as const;
export type CheckKind = (typeof CHECK_KINDS)[number];

/** One line of a stage's checklist. */
@Entity()
@Unique('plan_check_position_once', ['stageId', 'position'])
@Unique('plan_check_of_its_stage', ['id', 'stageId'])
@Check('plan_check_kind_known', `kind IN ('tick', 'measure', 'photo', 'safety', 'mentor''s eyes')`)
@Check('plan_check_measure_complete', `(kind = 'measure') = (method IS NOT NULL AND unit IS NOT NULL)`)
@Check('plan_check_window', `window_low IS NULL OR window_high IS NULL OR window_low < window_high`)
export class PlanCheck {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => Stage, { nullable: false })
  @JoinColumn({ name: 'stage_id', foreignKeyConstraintName: 'plan_check_of_stage' })
  stage: Relation<Stage>;

  /** Order on the checklist, from 1. */
  @Column('integer')
  position: number;

  @Column('text')
  kind: CheckKind;

  /** `Output level at TP9` */
  @Column('text')
  title: string;

  @Column('text', { default: '' })
  instruction: string;

  @Column('boolean', { default: true })
  isRequired: boolean;

  /** For a measure: how it is taken, a method the levels package knows. */
  @Column('text', { nullable: true })
  method: string | null;

  /** For a measure: unit of the value and of the window. */
  @Column('text', { nullable: true })
  unit: string | null;

  @Column('double precision', { nullable: true })
  windowLow: number | null;

  @Column('double precision', { nullable: true })
  windowHigh: number | null;

  @Column('double precision', { nullable: true })
  target: number | null;

  /** What the form starts with: load, probe, pads in line. */
  @Column('jsonb', { default: () => `'{}'` })
  defaults: Record<string, number>;

  /** For a value worked out from others: the checks it is made of, in the method's order. */
  @Column('uuid', { array: true, default: () => `'{}'` })
  fromCheckIds: string[];

  @Column('uuid', { nullable: true })
  levelPointId: string | null;

  @ManyToOne(() => LevelPoint, { nullable: true })
  @JoinColumn({ name: 'level_point_id', foreignKeyConstraintName: 'plan_check_level_point_exists' })
  levelPoint: Relation<LevelPoint> | null;

  @Column('uuid', { nullable: true })
  instrumentKindId: string | null;

  @ManyToOne(() => InstrumentKind, { nullable: true })
  @JoinColumn({ name: 'instrument_kind_id', foreignKeyConstraintName: 'plan_check_instrument_kind_exists' })
  instrumentKind: Relation<InstrumentKind> | null;
}
