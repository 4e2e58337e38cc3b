import { Check, Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';
import { Person } from '../people/person.entity';
import { BuildNight } from './build-night.entity';

export const PLACE_STATES = ['coming', 'waiting'] as const;
export type PlaceState = (typeof PLACE_STATES)[number];

/**
 * Somebody who said that they are coming. A deferred trigger (`build_night_place_kept`) sees to it, whoever writes,
 * that no more are coming than there are places, that nobody waits while a place is free, and that nobody who came
 * later stands before somebody who waits.
 */
@Entity()
@Unique('build_night_place_turn_once', ['nightId', 'turn'])
@Check('build_night_place_state_known', `state IN ('coming', 'waiting')`)
@Check('build_night_place_turn_positive', `turn > 0`)
export class BuildNightPlace {
  @PrimaryColumn('uuid')
  nightId: string;

  @PrimaryColumn('uuid')
  personId: string;

  @ManyToOne(() => BuildNight, { nullable: false })
  @JoinColumn({ name: 'night_id', foreignKeyConstraintName: 'build_night_place_of_night' })
  night: Relation<BuildNight>;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'build_night_place_of_person' })
  person: Relation<Person>;

  @Column('text')
  state: PlaceState;

  /** The order in which people said so, from 1; given out while the night's row is locked. */
  @Column('integer')
  turn: number;

  @Column('timestamptz')
  saidAt: Date;
}
