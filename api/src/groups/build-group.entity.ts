import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { Person } from '../people/person.entity';

/** Members who build together. */
@Entity()
@Unique('build_group_name_once', ['name'])
export class BuildGroup {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  /** When and where they usually meet, in words. */
  @Column('text', { default: '' })
  about: string;
}

/** Somebody in a group. */
@Entity()
export class BuildGroupMember {
  @PrimaryColumn('uuid')
  groupId: string;

  @ManyToOne(() => BuildGroup, { onDelete: 'CASCADE', nullable: false })
  @JoinColumn({ name: 'group_id', foreignKeyConstraintName: 'build_group_member_of_group' })
  group: Relation<BuildGroup>;

  @PrimaryColumn('uuid')
  personId: string;

  @ManyToOne(() => Person, { onDelete: 'CASCADE', nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'build_group_member_is_person' })
  person: Relation<Person>;
}
