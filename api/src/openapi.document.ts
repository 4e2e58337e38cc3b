import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';
import { ACCESS_COOKIE } from './auth/cookies';
import { ProblemDto } from './common/problem.dto';

/** The API described by OpenAPI: what the portal's client is made from. */
export function describeApi(app: INestApplication): OpenAPIObject {
  const description =
    'The interface of Ferrite Row. Sign in with POST /api/auth/sign-in; the session travels in httpOnly cookies. ' +
    'Times are ISO 8601 instants, money is in minor units, errors are RFC 9457 problem documents.';
  const builder = new DocumentBuilder()
    .setTitle('Ferrite Row')
    .setDescription(description)
    .setVersion('1')
    .addCookieAuth(ACCESS_COOKIE)
    .addGlobalResponse({
      status: 'default',
      description: 'A problem document',
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/ProblemDto' } } },
    });
  const document = SwaggerModule.createDocument(app, builder.build(), {
    extraModels: [ProblemDto],
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}.${method}`,
  });
  // By name, so that the order in which modules are wired changes nothing in the file under version control.
  const schemas = byName(document.components?.schemas ?? {});
  return { ...document, paths: byName(document.paths), components: { ...document.components, schemas } };
}

function byName<T>(record: Record<string, T>): Record<string, T> {
  return Object.fromEntries(Object.entries(record).sort(([a], [b]) => (a < b ? -1 : 1)));
}

export function setUpDocumentation(app: INestApplication): void {
  SwaggerModule.setup('api/docs', app, () => describeApi(app), {
    jsonDocumentUrl: 'api/openapi.json',
    customSiteTitle: 'Ferrite Row: the API',
  });
}
