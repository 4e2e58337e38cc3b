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
import { BuildStage } from './build-stage.entity';

/** The families of the level bench, as its addresses name them. */
export const BENCH_FAMILIES = [
  'conversions',
  'readings',
  'mixing',
  'pads',
  'chain',
  'filters',
  'matching',
  'guards',
] as const;
export type BenchFamily = (typeof BENCH_FAMILIES)[number];

/**
 * A calculation that its builder put on a stage: what was typed and what it came to. It is a note beside the readings;
 * no verdict and no sign-off rests on it.
 */
@Entity()
@Index('worksheet_of_stage', ['buildId', 'stageId', 'at'])
@Check('worksheet_family_known', `family IN (${BENCH_FAMILIES.map((family) => `'${family}'`).join(', ')})`)
@Check('worksheet_result_present', `length(btrim(result)) > 0`)
export class Worksheet {
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
      foreignKeyConstraintName: 'worksheet_of_build_stage',
    },
    {
      name: 'stage_id',
      referencedColumnName: 'stageId',
      foreignKeyConstraintName: 'worksheet_of_build_stage',
    },
  ])
  buildStage: Relation<BuildStage>;

  @Column('text')
  family: BenchFamily;

  /** The query of the page's address, so that it opens again with what was typed. */
  @Column('text')
  inputs: string;

  /** The result as plain lines. */
  @Column('text')
  result: string;

  @Column('timestamptz')
  at: Date;

  @Column('timestamptz', { nullable: true })
  takenBackAt: Date | null;
}
