import { ValidationPipe, type ValidationError } from '@nestjs/common';
import { commonProblems } from './common.errors';
import type { FieldProblem } from './domain-error';

/** Shapes are checked here, once, for every body, query and path; unknown fields are refused by name. */
export function validationPipe(): ValidationPipe {
  return new ValidationPipe({
    transform: true,
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    stopAtFirstError: true,
    validationError: { target: false, value: false },
    exceptionFactory: (errors) => {
      const fields = errors.flatMap((error) => flatten(error, '#'));
      const detail = fields[0]?.detail ?? 'Something in the form needs another look.';
      return commonProblems['invalid-input'](detail, { errors: fields });
    },
  });
}

function flatten(error: ValidationError, parent: string): FieldProblem[] {
  const pointer = `${parent}/${error.property.replaceAll('~', '~0').replaceAll('/', '~1')}`;
  const own = Object.entries(error.constraints ?? {}).map(([rule, detail]) => ({
    pointer,
    detail: rule === 'whitelistValidation' ? `There is no field named ${error.property}.` : `${detail}.`,
  }));
  return [...own, ...(error.children ?? []).flatMap((child) => flatten(child, pointer))];
}
