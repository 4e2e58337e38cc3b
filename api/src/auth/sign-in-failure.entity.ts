import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** A try whose password was not right, kept a while: in the database, because several API processes must count together. */
@Entity()
@Index('sign_in_failure_recent', ['email', 'failedAt'])
@Index('sign_in_failure_from', ['address', 'failedAt'])
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
