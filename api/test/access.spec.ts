import { METHOD_METADATA } from '@nestjs/common/constants';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import { ACCESS_RULE } from '../src/common/access';
import { startTestApp, type TestApp } from './app';

interface Handler {
  name: string;
  rule: unknown;
}

/** Every handler of every controller of ours, as the running application knows them. */
function handlersOf(test: TestApp): Handler[] {
  const controllers = test.app.get(DiscoveryService, { strict: false }).getControllers();
  return controllers.flatMap(({ metatype }) => {
    const prototype = (metatype as { prototype: object }).prototype;
    return new MetadataScanner().getAllMethodNames(prototype).flatMap((name) => {
      const method = (prototype as Record<string, unknown>)[name];
      if (typeof method !== 'function' || !Reflect.hasMetadata(METHOD_METADATA, method)) return [];
      return [
        { name: `${metatype?.name}.${name}`, rule: Reflect.getMetadata(ACCESS_RULE, method) as unknown },
      ];
    });
  });
}

describe('access', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  it('finds the routes at all', () => {
    expect(handlersOf(test).map(({ name }) => name)).toContain('AuthController.me');
  });

  it('declares who may use it on every route', () => {
    const open = handlersOf(test).filter(({ rule }) => rule === undefined);
    expect(open.map(({ name }) => name)).toEqual([]);
  });

  it('leaves only the listed routes open to people who are not signed in', () => {
    const anybody = handlersOf(test).filter(({ rule }) => rule === 'public');
    expect(anybody.map(({ name }) => name).sort()).toEqual([
      'AuthController.refresh',
      'AuthController.signIn',
      'AuthController.signOut',
      'ClubController.front',
      'HealthController.check',
      'ProblemsController.list',
      'ProblemsController.show',
      'WebhooksController.receive',
    ]);
  });
});
