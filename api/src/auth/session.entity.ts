import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Person } from '../people/person.entity';

/** One device's stay: from signing in until signing out, running out, or a stolen refresh token being seen. */
@Entity()
@Index('session_token_hash', ['tokenHash'], { unique: true })
@Index('session_person', ['personId'])
export class Session {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { onDelete: 'CASCADE', nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'session_person_exists' })
  person: Relation<Person>;

  /** SHA-256 of the refresh token in force; the token itself is only in the cookie. */
  @Column('text')
  tokenHash: string;

  /** The one before it; whoever still holds that may sign out with it. */
  @Column('text', { nullable: true })
  previousTokenHash: string | null;

  @Column('timestamptz')
  rotatedAt: Date;

  /** A bench tablet: runs out when untouched. */
  @Column('boolean', { default: false })
  isSharedDevice: boolean;

  @Column('timestamptz')
  startedAt: Date;

  @Column('timestamptz')
  expiresAt: Date;

  @Column('timestamptz', { nullable: true })
  endedAt: Date | null;
}
