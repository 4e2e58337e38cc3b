import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** A wrong password, kept an hour: in the database, because several API processes must count together. */
@Entity()
@Index('sign_in_failure_recent', ['email', 'failedAt'])
export class SignInFailure {
  @PrimaryGeneratedColumn('identity', { type: 'bigint' })
  id: string;

  @Column('text')
  email: string;

  @Column('text')
  address: string;

  @Column('timestamptz')
  failedAt: Date;
}
