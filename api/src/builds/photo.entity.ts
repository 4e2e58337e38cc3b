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

export const PHOTO_TYPES = ['image/jpeg', 'image/png', 'image/webp'] as const;
export type PhotoType = (typeof PHOTO_TYPES)[number];

/** A picture that shows a check. Its bytes live in the database, so that one backup holds everything. */
@Entity()
@Index('photo_by_check', ['buildId', 'checkId'])
@Check('photo_type_known', `content_type IN ('image/jpeg', 'image/png', 'image/webp')`)
@Check('photo_size', `octet_length(bytes) BETWEEN 1 AND 6291456`)
export class Photo {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  buildId: string;

  @Column('uuid')
  stageId: string;

  @ManyToOne(() => BuildStage, { nullable: false })
  @JoinColumn([
    { name: 'build_id', referencedColumnName: 'buildId', foreignKeyConstraintName: 'photo_of_stage' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'photo_of_stage' },
  ])
  buildStage: Relation<BuildStage>;

  @Column('uuid')
  checkId: string;

  @ManyToOne(() => PlanCheck, { nullable: false })
  @JoinColumn([
    { name: 'check_id', referencedColumnName: 'id', foreignKeyConstraintName: 'photo_of_check' },
    { name: 'stage_id', referencedColumnName: 'stageId', foreignKeyConstraintName: 'photo_of_check' },
  ])
  check: Relation<PlanCheck>;

  @Column('uuid')
  byPersonId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'by_person_id', foreignKeyConstraintName: 'photo_by_person' })
  byPerson: Relation<Person>;

  @Column('text')
  contentType: PhotoType;

  /** Only read when the picture itself is asked for. */
  @Column('bytea', { select: false })
  bytes: Buffer;

  /** SHA-256 of the bytes: their name for caches, and how the same picture sent twice is noticed. */
  @Column('text')
  sha256: string;

  @Column('text', { default: '' })
  caption: string;

  @Column('timestamptz')
  at: Date;

  @Column('timestamptz', { nullable: true })
  takenBackAt: Date | null;
}
