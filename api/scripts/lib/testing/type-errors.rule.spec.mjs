import assert from 'node:assert/strict';
import { before, describe, it } from 'node:test';
import { ESLint } from 'eslint';
import { inRoot } from '../paths.mjs';

describe('lint', () => {
  const eslint = new ESLint({ cwd: inRoot(), overrideConfigFile: inRoot('api/scripts/eslint.config.mjs') });
  /** @param {string} text @returns {Promise<string[]>} what is said of a file of the levels package with this text */
  async function saidOf(text) {
    const [result] = await eslint.lintText(text, { filePath: inRoot('api/levels/src/index.ts') });
    return (result?.messages ?? []).map(({ ruleId, message, line }) => `${line} ${ruleId}: ${message}`);
  }
  before(() => saidOf('export {};\n'));

  it("reports what the compiler would, with the compiler's words and number", async () => {
    assert.deepEqual(await saidOf("export {};\nexport const level: number = 'loud';\n"), [
      "2 house/type-errors: Type 'string' is not assignable to type 'number'. (TS2322)",
    ]);
  });

  it('says nothing of what compiles', async () => {
    assert.deepEqual(await saidOf('export const level: number = -7;\n'), []);
  });
});
