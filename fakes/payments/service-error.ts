export type ErrorType = 'invalid_request_error' | 'idempotency_error' | 'api_error';

/** A refusal in the protocol's own shape; the SDK turns it into its typed errors by status and type. */
export class ServiceError extends Error {
  constructor(
    readonly status: 400 | 401 | 404 | 413 | 500,
    message: string,
    readonly fields: { code?: string; param?: string } = {},
    readonly type: ErrorType = 'invalid_request_error',
  ) {
    super(message);
  }

  body() {
    return { error: { type: this.type, message: this.message, ...this.fields } };
  }
}

export const badParameter = (param: string, message: string, code = 'parameter_invalid') =>
  new ServiceError(400, message, { param, code });

export const missingParameter = (param: string) =>
  badParameter(param, `Missing required parameter: ${param}`, 'parameter_missing');

export const unknownParameter = (param: string) =>
  badParameter(param, `This stand-in does not know the parameter: ${param}`, 'parameter_unknown');

export const notFound = (id: string, param = 'id') =>
  new ServiceError(404, `Nothing is stored under ${id}`, { param, code: 'resource_missing' });
