import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runInNewContext } from 'node:vm';
import * as levels from './index';

const examples = documentedExamples(__dirname);
const throwing = examples.filter(({ expected }) => expected.startsWith('throws '));
const returning = examples.filter(({ expected }) => !expected.startsWith('throws '));

/** Six decimals is what the docstrings print. Through JSON, so that objects of both realms compare. */
function shown(value: unknown): unknown {
  if (value === undefined) return 'undefined';
  const round = (_key: string, inner: unknown) =>
    typeof inner === 'number' ? Number(inner.toFixed(6)) : inner;
  return JSON.parse(JSON.stringify(value, round));
}

const evaluated = (code: string): unknown => runInNewContext(`(${code})`, { ...levels });

describe('examples in docstrings', () => {
  it.each(returning)('$owner: $expression gives $expected', ({ expression, expected }) => {
    expect(shown(evaluated(expression))).toEqual(shown(evaluated(expected)));
  });

  it.each(throwing)('$owner: $expression $expected', ({ expression, expected }) => {
    const name = expected.replace('throws ', '');
    expect(() => evaluated(expression)).toThrow(expect.objectContaining({ name }));
  });

  it('stand at every function the package offers', () => {
    const offered = Object.entries(levels)
      .filter(([, value]) => typeof value === 'function' && !/^class /.test(value.toString()))
      .map(([name]) => name);
    const shownBy = new Set(examples.map(({ owner }) => owner));
    expect(offered.length).toBeGreaterThan(30);
    expect(offered.filter((name) => !shownBy.has(name))).toEqual([]);
  });
});

/** One `@example` of a docstring: `expression //=> expected`. */
interface DocExample {
  owner: string;
  expression: string;
  expected: string;
}

/** Every example of the package's docstrings, with the name of what it documents. */
function documentedExamples(folder: string): DocExample[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts') && !file.endsWith('.spec.ts'))
    .flatMap((file) => examplesIn(readFileSync(join(folder, file), 'utf8')));
}

function examplesIn(source: string): DocExample[] {
  const documented = /\/\*\*(?<doc>(?:(?!\*\/)[\s\S])*)\*\/\s*export (?:function|const) (?<owner>\w+)/g;
  return [...source.matchAll(documented)].flatMap(({ groups = {} }) => {
    const text = (groups.doc ?? '').replace(/^\s*\* ?/gm, '');
    return text
      .split(/^@/m)
      .filter((tag) => tag.startsWith('example'))
      .map((tag) => exampleOf(groups.owner ?? '', tag.slice('example'.length)));
  });
}

function exampleOf(owner: string, text: string): DocExample {
  const [expression = '', expected, ...more] = text.split('//=>');
  if (expected === undefined || more.length > 0)
    throw new Error(`${owner}: an example reads "expression //=> expected"`);
  return { owner, expression: expression.trim(), expected: expected.trim() };
}
