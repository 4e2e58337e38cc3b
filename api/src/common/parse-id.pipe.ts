import { Injectable, type ArgumentMetadata, type PipeTransform } from '@nestjs/common';
import { commonProblems } from './common.errors';
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
    const detail = `${name} in the address is not an id.`;
    throw commonProblems['unreadable-request'](detail, { errors: [{ pointer: `#/${name}`, detail }] });
  }
}
