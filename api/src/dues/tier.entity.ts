import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { minorUnits } from '../common/minor-units';
import { Person } from '../people/person.entity';

/** A class of dues: so much for so many months. */
@Entity()
@Unique('tier_name_once', ['name'])
@Check('tier_amount_positive', `amount_minor > 0`)
@Check('tier_months_sensible', `months BETWEEN 1 AND 12`)
export class Tier {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  @Column('smallint')
  months: number;
}

/** The tier of a person from a day on, until the next one. */
@Entity()
export class PersonTier {
  @PrimaryColumn('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'person_tier_is_person' })
  person: Relation<Person>;

  @PrimaryColumn('date')
  fromOn: string;

  @Column('uuid')
  tierId: string;

  @ManyToOne(() => Tier, { nullable: false })
  @JoinColumn({ name: 'tier_id', foreignKeyConstraintName: 'person_tier_exists' })
  tier: Relation<Tier>;
}
