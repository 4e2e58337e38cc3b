import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';
import { isOutOfTurn } from './busy';
import { commonProblems } from './common.errors';
import { DomainError } from './domain-error';

interface ProblemDocument {
  type: string;
  title: string;
  status: number;
  detail: string;
  instance: string;
  [member: string]: unknown;
}

/** After a request was given up for the sake of others. */
const AGAIN_SECONDS = 2;

/** Whether anything was changed before it went wrong, nobody knows who did not plan it. */
const UNPLANNED = commonProblems.unplanned(
  'Something went wrong on the server. Look whether it was done before you try again. The number below finds it in the log.',
);

/** Writes every answer that is not a success as an RFC 9457 problem document. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request & { id?: string }>();
    const response = http.getResponse<Response>();
    const instance = `urn:ferrite-row:request:${String(request.id ?? 'unknown')}`;
    const refusal = asRefusal(error) ?? UNPLANNED;
    if (refusal === UNPLANNED)
      this.logger.error({ err: error, instance }, 'A request failed for a reason nobody planned');
    if (response.headersSent) {
      response.end();
      return;
    }
    const { retryAfterSeconds } = refusal.extras.extra ?? {};
    if (typeof retryAfterSeconds === 'number') response.setHeader('Retry-After', String(retryAfterSeconds));
    const document = describe(refusal, instance);
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

/** What the body parser, the router and the upload handler throw is a refusal too, with words of ours. */
function asRefusal(error: unknown): DomainError | undefined {
  if (error instanceof DomainError) return error;
  if (isOutOfTurn(error)) {
    const extra = { retryAfterSeconds: AGAIN_SECONDS };
    return commonProblems.busy(
      'The server had too much to do at once and gave this up. Try again in a moment.',
      { extra },
    );
  }
  const status = statusOf(error);
  if (status === 503)
    return commonProblems['not-now']('The portal cannot answer at the moment. Try again shortly.');
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
