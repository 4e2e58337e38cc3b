import {
  applyDecorators,
  Injectable,
  UseInterceptors,
  type CallHandler,
  type ExecutionContext,
  type NestInterceptor,
} from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import { ApiConsumes } from '@nestjs/swagger';
import type { Request } from 'express';
import type { Observable } from 'rxjs';
import { commonProblems } from './common.errors';

const FORM = 'multipart/form-data';

/** The form's parser begins on anything called multipart, and fails on what is not a form with an error of its own. */
@Injectable()
class OnlyForms implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const request = context.switchToHttp().getRequest<Request>();
    // Without a type nothing was sent, and the use case says what is missing.
    if (request.headers['content-type'] !== undefined && !request.is(FORM))
      throw commonProblems['wrong-kind-of-file'](`This address takes a file in a form: ${FORM}.`);
    return next.handle();
  }
}

/** A route that takes one file in a form, beside so many text fields. */
export function TakesFile(
  field: string,
  { bytes, fields = 0 }: { bytes: number; fields?: number },
): MethodDecorator {
  return applyDecorators(
    ApiConsumes(FORM),
    UseInterceptors(OnlyForms, FileInterceptor(field, { limits: { fileSize: bytes, files: 1, fields } })),
  );
}
