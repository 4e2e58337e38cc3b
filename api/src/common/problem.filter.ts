import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';
import { commonProblems } from './common.errors';
import { DomainError } from './domain-error';
import { wantsAnotherTry } from './retrying';

interface ProblemDocument {
  type: string;
  title: string;
  status: number;
  detail: string;
  instance: string;
  [member: string]: unknown;
}

/** Writes every answer that is not a success as an RFC 9457 problem document. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request & { id?: string }>();
    const response = http.getResponse<Response>();
    const instance = `urn:ferrite-row:request:${String(request.id ?? 'unknown')}`;
    const refusal = asRefusal(error);
    if (!refusal) this.logger.error({ err: error, instance }, 'A request failed for a reason nobody planned');
    if (response.headersSent) {
      response.end();
      return;
    }
    const { retryAfterSeconds } = refusal?.extras.extra ?? {};
    if (typeof retryAfterSeconds === 'number') response.setHeader('Retry-After', String(retryAfterSeconds));
    const document = refusal ? describe(refusal, instance) : unplanned(instance);
    response.status(document.status).type('application/problem+json').send(JSON.stringify(document));
  }
}

function describe(refusal: DomainError, instance: string): ProblemDocument {
  const { code, kind, detail, extras } = refusal;
  const errors = extras.errors?.length ? { errors: extras.errors } : {};
  return {
    type: `/problems/${code}`,
    title: kind.title,
    status: kind.status,
    detail,
    instance,
    ...errors,
    ...extras.extra,
  };
}

function unplanned(instance: string): ProblemDocument {
  const detail =
    'Something went wrong on the server. Nothing was changed. The number below finds it in the log.';
  return { type: '/problems/unplanned', title: 'Something went wrong', status: 500, detail, instance };
}

/** What the body parser, the router and the upload handler throw is a refusal too, with words of ours. */
function asRefusal(error: unknown): DomainError | undefined {
  if (error instanceof DomainError) return error;
  if (wantsAnotherTry(error))
    return commonProblems.busy('Somebody else is changing the same thing. Nothing was changed; try again.');
  const status = statusOf(error);
  if (status === undefined || status >= 500) return undefined;
  if (status === 401) return commonProblems['not-signed-in']('Sign in to go on.');
  if (status === 403) return commonProblems['not-allowed']('This is not open to you.');
  if (status === 404) return commonProblems['not-found']('There is nothing at this address.');
  if (status === 413) return commonProblems['too-large']('What was sent is larger than this address takes.');
  if (status === 415)
    return commonProblems['wrong-kind-of-file']('This address does not take that kind of content.');
  if (status === 422) return commonProblems['invalid-input']('Something in the form needs another look.');
  return commonProblems['unreadable-request']('The request could not be read: it is not well-formed.');
}

function statusOf(error: unknown): number | undefined {
  if (error instanceof HttpException) return error.getStatus();
  if (typeof error !== 'object' || error === null) return undefined;
  if ('status' in error && typeof error.status === 'number') return error.status;
  if (error instanceof URIError) return 400;
  return undefined;
}
