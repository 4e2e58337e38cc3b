import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** A letter waiting to be sent or already sent. Written in the transaction of the act it tells of. */
@Entity()
@Index('mail_waiting', ['dueAt'], { where: 'sent_at IS NULL AND given_up_at IS NULL' })
export class Mail {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  to: string;

  @Column('text')
  subject: string;

  @Column('text')
  text: string;

  @Column('timestamptz')
  queuedAt: Date;

  /** Not before; moves on with every failed try. */
  @Column('timestamptz')
  dueAt: Date;

  @Column('integer', { default: 0 })
  tries: number;

  @Column('text', { nullable: true })
  lastError: string | null;

  @Column('timestamptz', { nullable: true })
  sentAt: Date | null;

  @Column('timestamptz', { nullable: true })
  givenUpAt: Date | null;
}
