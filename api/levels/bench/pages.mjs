// What the package adds to each page of the portal: the page bundled with it, less the page bundled without.
import { readdirSync } from 'node:fs';
import { builtinModules } from 'node:module';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';

const PORTAL = fileURLToPath(new URL('../../../portal/src/', import.meta.url));
const PACKAGE = '@ferrite-row/levels';
const OURS = fileURLToPath(new URL('../src/index.ts', import.meta.url));

/** Pages by their file's name, and the worker, which carries its own copy of what it uses. */
const inputs = () =>
  readdirSync(PORTAL, { recursive: true })
    .filter((file) => /(pages\/\w+Page\.tsx|\.worker\.ts|^main\.tsx)$/.test(file))
    .map((file) => path.join(PORTAL, file));

/** Other packages stay outside; so does what is only loaded when asked for, which is another page. */
function plugin(isWith) {
  return {
    name: 'portal-alone',
    resolveId(id, importer, { kind }) {
      if (importer === undefined || id.startsWith('.'))
        return kind === 'dynamic-import' ? { id, external: true } : null;
      if (id === PACKAGE && isWith) return OURS;
      return path.isAbsolute(id) && !builtinModules.includes(id) ? null : { id, external: true };
    },
  };
}

async function gzippedPage({ rolldown }, input, isWith) {
  const bundle = await rolldown({
    input,
    plugins: [plugin(isWith)],
    logLevel: 'silent',
    moduleTypes: { '.woff2': 'empty', '.svg': 'empty', '.css': 'empty' },
  });
  const { output } = await bundle.generate({ format: 'esm', minify: true });
  return gzipSync(output.map(({ code = '' }) => code).join('\n'), { level: 9 }).length;
}

/** @returns {Promise<[name: string, kilobytes: number][]>} the heaviest first */
export async function addedToPages(bundler) {
  const added = [];
  for (const input of inputs()) {
    const [whole, without] = [
      await gzippedPage(bundler, input, true),
      await gzippedPage(bundler, input, false),
    ];
    added.push([path.basename(input), (whole - without) / 1000]);
  }
  return added.sort(([, a], [, b]) => b - a);
}
