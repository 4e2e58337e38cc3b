import type { UncertaintyComponent } from '@ferrite-row/levels';
import {
  Check,
  Column,
  Entity,
  Generated,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Resource } from '../instruments/resource.entity';
import { Person } from '../people/person.entity';
import { PlanCheck } from '../plans/plan-check.entity';
import { BuildStage } from './build-stage.entity';

export const VERDICTS = ['pass', 'too close to call', 'not yet'] as const;
export type KeptVerdict = (typeof VERDICTS)[number];

/**
 * One measured value on a check: what was typed, and what it came to. Never changed and never deleted; a retake adds one.
 * The reading in force is the one taken last.
 */
@Entity()
@Index('reading_latest', ['buildId', 'checkId', 'takenAt', 'sequence'])
@Check('reading_verdict_known', `verdict IN ('pass', 'too close to call', 'not yet')`)
@Check('reading_value_finite', `abs(value) <= 1e15`)
@Check(
  'reading_uncertainty_sound',
  `standard_uncertainty >= 0 AND expanded_uncertainty >= standard_uncertainty AND expanded_uncertainty <= 1e15`,
)
@Check('reading_times_in_order', `taken_at <= kept_at`)
export class Reading {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  buildId: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => BuildStage, { nullable: false })
  @JoinColumn([
    { name: 'build_id', referencedColumnName: 'buildId', foreignKeyConstraintName: 'reading_of_stage' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'reading_of_stage' },
  ])
  buildStage: Relation<BuildStage>;

  @Column('uuid')
  checkId: string;

  @ManyToOne(() => PlanCheck, { nullable: false })
  @JoinColumn([
    { name: 'check_id', referencedColumnName: 'id', foreignKeyConstraintName: 'reading_of_check' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'reading_of_check' },
  ])
  check: Relation<PlanCheck>;

  @Column('uuid')
  byPersonId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'by_person_id', foreignKeyConstraintName: 'reading_by_person' })
  byPerson: Relation<Person>;

  /** Order in which readings were kept. */
  @Column('bigint')
  @Generated('increment')
  sequence: string;

  @Column('text')
  method: string;

  /** Word for word as typed, by field; empty for a value that worked itself out. */
  @Column('jsonb')
  entry: Record<string, string>;

  /** The numbers the calculation took: those typed, in the units of the fields, and those assumed. */
  @Column('jsonb')
  inputs: Record<string, number>;

  /** For a value that worked itself out: the readings it was made of, in the method's order. */
  @Column('uuid', { array: true, default: () => `'{}'` })
  fromReadingIds: string[];

  @Column('double precision')
  value: number;

  @Column('text')
  unit: string;

  @Column('text')
  uncertaintyUnit: string;

  @Column('double precision')
  standardUncertainty: number;

  /** k = 2. */
  @Column('double precision')
  expandedUncertainty: number;

  @Column('jsonb')
  components: UncertaintyComponent[];

  @Column('double precision', { nullable: true })
  voltsPeakToPeak: number | null;

  @Column('double precision', { nullable: true })
  watts: number | null;

  @Column('text')
  verdict: KeptVerdict;

  /** Name and version of the calculation: `oscilloscope/1`. */
  @Column('text')
  calculation: string;

  @Column('uuid', { nullable: true })
  instrumentId: string | null;

  @ManyToOne(() => Resource, { nullable: true })
  @JoinColumn({ name: 'instrument_id', foreignKeyConstraintName: 'reading_with_instrument' })
  instrument: Relation<Resource> | null;

  /** The instrument's tag and last day of calibration as they were then. */
  @Column('text', { nullable: true })
  instrumentTag: string | null;

  @Column('date', { nullable: true })
  calibrationDueOn: string | null;

  /** The grave caution on the form was ticked for this very reading. */
  @Column('boolean', { default: false })
  cautionAcknowledged: boolean;

  @Column('timestamptz')
  takenAt: Date;

  @Column('timestamptz')
  keptAt: Date;
}
