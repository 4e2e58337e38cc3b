import type { InstrumentFigures } from '@ferrite-row/levels';
import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { InstrumentKind } from './instrument-kind.entity';
import { Resource } from './resource.entity';

export const CONDITIONS = ['ready', 'in repair', 'out of use'] as const;
export type Condition = (typeof CONDITIONS)[number];

/** What makes a resource an instrument. */
@Entity()
@Index('instrument_of_kind', ['kindId'])
@Check('instrument_condition_known', `condition IN ('ready', 'in repair', 'out of use')`)
@Check('instrument_accuracy_positive', `amplitude_accuracy_db IS NULL OR amplitude_accuracy_db > 0`)
@Check(
  'instrument_figures_numbers',
  `jsonb_typeof(figures) = 'object' AND NOT jsonb_path_exists(figures, '$.* ? (@.type() != "number")')`,
)
export class Instrument {
  @PrimaryColumn('uuid')
  resourceId: string;

  @OneToOne(() => Resource, { nullable: false })
  @JoinColumn({ name: 'resource_id', foreignKeyConstraintName: 'instrument_is_resource' })
  resource: Relation<Resource>;

  @Column('uuid')
  kindId: string;

  @ManyToOne(() => InstrumentKind, { nullable: false })
  @JoinColumn({ name: 'kind_id', foreignKeyConstraintName: 'instrument_kind_exists' })
  kind: Relation<InstrumentKind>;

  @Column('text', { default: 'ready' })
  condition: Condition;

  /** Why it is not ready, or what to mind. */
  @Column('text', { default: '' })
  conditionNote: string;

  /** Last day on which its calibration holds; null where the kind needs none. */
  @Column('date', { nullable: true })
  calibrationDueOn: string | null;

  /** The level that harms its input, dBm. */
  @Column('double precision', { nullable: true })
  damageLevelDbm: number | null;

  /** ± limit of its level readings from its last calibration, dB. */
  @Column('double precision', { nullable: true })
  amplitudeAccuracyDb: number | null;

  /** What else its sheet says that a reading is worked out with, by the name the levels package has for it. */
  @Column('jsonb', { default: () => `'{}'` })
  figures: InstrumentFigures;
}

/** All figures of an instrument that a reading may be worked out with. */
export function figuresOf({
  figures,
  amplitudeAccuracyDb,
}: Pick<Instrument, 'figures' | 'amplitudeAccuracyDb'>): InstrumentFigures {
  return { ...figures, ...(amplitudeAccuracyDb !== null && { amplitudeAccuracyDb }) };
}
