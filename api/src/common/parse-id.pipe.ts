import { Injectable, type ArgumentMetadata, type PipeTransform } from '@nestjs/common';
import { commonProblems } from './common.errors';
import type { DomainError } from './domain-error';
import { isId } from './id';

/**
 * An id in the address, in lower case as the database writes it.
 *
 * @throws DomainError `unreadable-request` (400) that names the part of the address
 */
@Injectable()
export class ParseIdPipe implements PipeTransform<string, string> {
  transform(value: string, { data: name = 'id' }: ArgumentMetadata): string {
    if (isId(value)) return value.toLowerCase();
    throw unreadablePart(name, 'an id');
  }
}

/** A part of the address, by its name, is not what it should be. */
export function unreadablePart(name: string, wanted: string): DomainError {
  const detail = `${name} in the address is not ${wanted}.`;
  return commonProblems['unreadable-request'](detail, { errors: [{ pointer: `#/${name}`, detail }] });
}
