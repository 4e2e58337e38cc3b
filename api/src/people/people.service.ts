import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, Repository, type EntityManager } from 'typeorm';
import { requireMember, type Actor, type Role } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { skipOf } from '../common/paging.dto';
import type { ListPeopleQueryDto, PeoplePageDto } from './dto/list-people.dto';
import { personDto, type PersonDto } from './dto/person.dto';
import { Person } from './person.entity';

export interface NewPerson {
  email: string;
  name: string;
  roles: Role[];
  passwordHash: string | null;
}

@Injectable()
export class PeopleService {
  constructor(
    @InjectRepository(Person) private readonly people: Repository<Person>,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, query: ListPeopleQueryDto): Promise<PeoplePageDto> {
    requireMember(actor);
    const found = this.people.createQueryBuilder('person').where('person.left_at IS NULL');
    if (query.role) found.andWhere(':role = ANY (person.roles)', { role: query.role });
    if (query.name) found.andWhere('strpos(lower(person.name), lower(:name)) > 0', { name: query.name });
    const [people, total] = await found
      .orderBy('person.name')
      .addOrderBy('person.id')
      .skip(skipOf(query))
      .take(query.perPage)
      .getManyAndCount();
    return { items: people.map(personDto), total, page: query.page, perPage: query.perPage };
  }

  async show(actor: Actor, personId: string): Promise<PersonDto> {
    requireMember(actor);
    const person = await this.people.findOneBy({ id: personId });
    if (!person) throw notFound('person');
    return personDto(person);
  }

  /** For other features: the people behind these ids, those who left among them, by id. */
  async byIds(personIds: readonly string[], manager?: EntityManager): Promise<Map<string, Person>> {
    if (personIds.length === 0) return new Map();
    const people = await (manager?.getRepository(Person) ?? this.people).findBy({
      id: In([...new Set(personIds)]),
    });
    return new Map(people.map((person) => [person.id, person]));
  }

  /** For other features: everybody who holds the role and has not left. */
  async holding(role: Role): Promise<Person[]> {
    return this.people
      .createQueryBuilder('person')
      .where(':role = ANY (person.roles) AND person.left_at IS NULL', { role })
      .orderBy('person.name')
      .getMany();
  }

  /** For first set-up and seeds: writes people down with their roles. */
  async enrol(people: NewPerson[], manager?: EntityManager): Promise<Person[]> {
    const repository = manager?.getRepository(Person) ?? this.people;
    const createdAt = this.clock.now();
    return repository.save(people.map((person) => repository.create({ ...person, createdAt, leftAt: null })));
  }
}
