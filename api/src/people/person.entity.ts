import { Check, Column, CreateDateColumn, Entity, PrimaryGeneratedColumn, Unique } from 'typeorm';
import type { Role } from '../common/actor';

/** Somebody of the club. A person without a password has been written down but cannot sign in. */
@Entity()
@Unique('person_email_once', ['email'])
@Check('person_email_lower', `email = lower(email)`)
@Check('person_name_present', `length(btrim(name)) > 0`)
@Check(
  'person_roles_known',
  `roles <@ ARRAY['member','mentor','steward','treasurer','organiser']::text[] AND 'member' = ANY (roles)`,
)
export class Person {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  email: string;

  @Column('text')
  name: string;

  @Column('text', { array: true, default: () => `'{member}'` })
  roles: Role[];

  /** argon2id, with its own parameters written inside. */
  @Column('text', { nullable: true, select: false })
  passwordHash: string | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  /** Left the club: may not sign in, stays in the records. */
  @Column('timestamptz', { nullable: true })
  leftAt: Date | null;
}
