import { ValidationPipe, type ValidationError } from '@nestjs/common';
import { getMetadataStorage, ValidationTypes } from 'class-validator';
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
    // For the words below only; neither goes into the answer.
    validationError: { target: true, value: true },
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
    detail: wordsFor(error, rule) ?? `${detail}.`,
  }));
  return [...own, ...(error.children ?? []).flatMap((child) => flatten(child, pointer))];
}

/** What is not there breaks every rule of its field, and none of their words says so. */
function wordsFor({ property, value, target }: ValidationError, rule: string): string | undefined {
  if (rule === 'whitelistValidation') return `There is no field named ${property}.`;
  if (value === undefined) return `${property} is needed.`;
  if (value !== null) return undefined;
  return mayBeLeftOut(target, property)
    ? `${property} may be left out, but not be null.`
    : `${property} is needed.`;
}

function mayBeLeftOut(target: object | undefined, property: string): boolean {
  const rules = getMetadataStorage().getTargetValidationMetadatas(
    target?.constructor ?? Object,
    '',
    false,
    false,
  );
  return rules.some(
    ({ type, propertyName }) => type === ValidationTypes.CONDITIONAL_VALIDATION && propertyName === property,
  );
}
