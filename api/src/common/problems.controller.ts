import { Controller, Get, Param } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import { Access } from './access';
import { notFound } from './common.errors';
import { allProblems } from './domain-error';

/** Explains the `type` of a problem document at the address it names. */
@ApiExcludeController()
@Controller('problems')
export class ProblemsController {
  @Get()
  @Access('public')
  list(): { type: string; status: number; title: string }[] {
    return [...allProblems()].map(([code, { status, title }]) => ({
      type: `/problems/${code}`,
      status,
      title,
    }));
  }

  @Get(':code')
  @Access('public')
  show(@Param('code') code: string): { type: string; status: number; title: string } {
    const problem = this.list().find(({ type }) => type === `/problems/${code}`);
    if (!problem) throw notFound('kind of problem');
    return problem;
  }
}
