import ts from 'typescript';

/**
 * The compiler's errors as ESLint's. The typed rules have made TypeScript think through most of a file already; this
 * one asks for the rest, where `tsc` beside it would read and check everything a second time.
 * @type {import('eslint').Rule.RuleModule}
 */
export const typeErrors = {
  meta: { type: 'problem', schema: [], messages: { error: '{{text}} (TS{{code}})' } },
  create(context) {
    const { sourceCode } = context;
    const { program } = /** @type {{ program: ts.Program }} */ (sourceCode.parserServices);
    /** @param {ts.Diagnostic} diagnostic */
    const report = ({ start = 0, length = 0, messageText, code }) => {
      const text = ts.flattenDiagnosticMessageText(messageText, ' ');
      const loc = {
        start: sourceCode.getLocFromIndex(start),
        end: sourceCode.getLocFromIndex(start + length),
      };
      context.report({ messageId: 'error', data: { text, code: String(code) }, loc });
    };
    return {
      Program: () =>
        ts.getPreEmitDiagnostics(program, program.getSourceFile(context.filename)).forEach(report),
    };
  },
};
