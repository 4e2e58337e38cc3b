import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import { Passwords } from '../../src/auth/passwords';
import type { Role } from '../../src/common/actor';
import { PeopleService, type NewPerson } from '../../src/people/people.service';
import type { Person } from '../../src/people/person.entity';
import type { TestApp } from '../app';

export const PASSWORD = 'correct horse battery';

/** Somebody of the club; every call a new one. */
export async function person(test: TestApp, overrides: Partial<NewPerson> = {}): Promise<Person> {
  const passwordHash = await test.app.get(Passwords).hash(PASSWORD);
  const email = `someone-${randomUUID()}@larkmoor.example`;
  const roles: Role[] = ['member'];
  const [made] = await test.app
    .get(PeopleService)
    .enrol([{ email, name: 'Some One', roles, passwordHash, ...overrides }]);
  if (!made) throw new Error('enrol made nobody');
  return made;
}

/** Requests that carry this person's session. */
export async function signedInAs(test: TestApp, someone: Person): Promise<supertest.Agent> {
  const agent = test.http();
  await agent.post('/api/auth/sign-in').send({ email: someone.email, password: PASSWORD }).expect(200);
  return agent;
}

/** The session as a `cookie` header, for requests over real sockets. */
export async function cookiesOf(test: TestApp, someone: Person): Promise<string> {
  const body = JSON.stringify({ email: someone.email, password: PASSWORD });
  const headers = { 'content-type': 'application/json' };
  const answer = await fetch(`${test.baseUrl}/api/auth/sign-in`, { method: 'POST', headers, body });
  return answer.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}

/** A new person with these roles beside member, and requests that carry their session. */
export async function someoneWith(
  test: TestApp,
  ...roles: Role[]
): Promise<{ person: Person; agent: supertest.Agent }> {
  const made = await person(test, { roles: ['member', ...roles.filter((role) => role !== 'member')] });
  return { person: made, agent: await signedInAs(test, made) };
}
