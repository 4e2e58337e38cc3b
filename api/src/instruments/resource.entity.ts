import { Check, Column, Entity, PrimaryGeneratedColumn, Unique } from 'typeorm';

/** Anything that can be booked: a bench, or an instrument (which has a row of its own beside this one). */
@Entity()
@Unique('resource_tag_once', ['tag'])
@Check('resource_kind_known', `kind IN ('bench', 'instrument')`)
export class Resource {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  kind: 'bench' | 'instrument';

  /** What is written on it: `Bench 3`, `FR-021`. */
  @Column('text')
  tag: string;

  /** What it is called: `By the window`, `Oscilloscope`. */
  @Column('text')
  name: string;

  /** Order on the page. */
  @Column('integer', { default: 0 })
  position: number;

  /** No longer offered; its past bookings stay. */
  @Column('timestamptz', { nullable: true })
  retiredAt: Date | null;
}
