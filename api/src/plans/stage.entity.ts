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
import { PlanEdition } from './plan-edition.entity';

export const CAUTIONS = [
  'load before power',
  'hot parts',
  'rf power',
  'mains',
  'rf exposure',
  'licence needed',
] as const;
export type Caution = (typeof CAUTIONS)[number];

/** One step of the plan, in signal order as far as there is a signal. */
@Entity()
@Unique('stage_position_once', ['editionId', 'position'])
@Check('stage_position_positive', `position > 0`)
@Check(
  'stage_cautions_known',
  `cautions <@ ARRAY['load before power','hot parts','rf power','mains','rf exposure','licence needed']::text[]`,
)
export class Stage {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  editionId: string;

  @ManyToOne(() => PlanEdition, { nullable: false })
  @JoinColumn({ name: 'edition_id', foreignKeyConstraintName: 'stage_of_edition' })
  edition: Relation<PlanEdition>;

  /** 1 is the first. */
  @Column('integer')
  position: number;

  /** `Pre-driver` */
  @Column('text')
  name: string;

  @Column('text', { default: '' })
  summary: string;

  @Column('text', { array: true, default: () => `'{}'` })
  cautions: Caution[];
}
