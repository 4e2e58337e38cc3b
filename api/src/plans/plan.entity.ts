import { Column, Entity, PrimaryGeneratedColumn, Unique } from 'typeorm';

/** What a transmitter is built to. Its content is in numbered editions. */
@Entity()
@Unique('plan_name_once', ['name'])
export class Plan {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** `Larkmoor Twenty` */
  @Column('text')
  name: string;

  @Column('text', { default: '' })
  summary: string;
}
