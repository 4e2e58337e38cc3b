// Ratios of the package's heavy loops against plain ones, each pair measured turn about in one run, so that a busy
// machine slows both. Runs on the built package: npm run build -w api/levels && npm run bench -w api/levels
import { readFileSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import {
  frequencyGrid,
  ladderBuilds,
  ladderResponse,
  lowPassLadder,
  productTable,
  scanProducts,
  spreadBands,
} from '../dist/index.js';
import { libraryResponse } from './library-response.mjs';
import { addedToPages } from './pages.mjs';

const say = (text) => process.stdout.write(`${text}\n`);
/** A package that may be there or not; what is not installed is not measured, and the output says so. */
const optional = (name) => import(name).catch(() => undefined);
const middle = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];

function timed(work) {
  const start = performance.now();
  work();
  return performance.now() - start;
}

/** Medians of two pieces of work, measured turn about after both are warm. */
function compared(ours, other, rounds = 31) {
  for (let round = 0; round < 5; round++) [ours, other].forEach((work) => work());
  const times = [[], []];
  for (let round = 0; round < rounds; round++) {
    times[0].push(timed(ours));
    times[1].push(timed(other));
  }
  return times.map(middle);
}

function products() {
  const settings = frequencyGrid(5e6, 35e6, 10_000);
  const { lo, if: intermediate } = productTable(15);
  const frequencies = new Float64Array(settings.length * lo.length);
  const bare = () => {
    for (let setting = 0, at = 0; setting < settings.length; setting++) {
      const frequency = settings[setting];
      for (let pair = 0; pair < lo.length; pair++, at++) {
        frequencies[at] = Math.abs(lo[pair] * frequency + intermediate[pair] * 9e6);
      }
    }
  };
  const input = {
    loHertz: settings,
    ifHertz: 9e6,
    wanted: 'sum',
    maxOrder: 15,
    bandLowHertz: 14e6,
    bandHighHertz: 14.35e6,
  };
  const [ours, other] = compared(() => scanProducts(input), bare);
  say(`Products to order 15, 10,000 settings: ${ours.toFixed(1)} ms, judged against a band`);
  say(
    `  bare typed-array loop, frequencies only: ${other.toFixed(1)} ms; ratio ${(ours / other).toFixed(2)} (3 at most)`,
  );
}

function response() {
  const nine = {
    family: 'Chebyshev',
    order: 9,
    rippleDb: 0.1,
    cutoffHertz: 15e6,
    sourceOhms: 50,
    first: 'series',
  };
  const ladder = lowPassLadder(nine);
  const hertz = frequencyGrid(1e6, 60e6, 2001);
  const ours = () => ladderResponse(ladder, hertz, { inductorQ: 180 });
  const against = (name, work) => {
    const [fast, slow] = compared(ours, work, 15);
    say(`  ${name}: ${slow.toFixed(2)} ms; ratio ${(slow / fast).toFixed(0)}`);
  };
  say(
    `Response of 9 elements at 2,001 frequencies: ${middle(Array.from({ length: 31 }, () => timed(ours))).toFixed(3)} ms`,
  );
  against('complex.js (20 at least)', () => libraryResponse(ladder, hertz, 180));
}

function spread() {
  const seven = {
    family: 'Chebyshev',
    order: 7,
    rippleDb: 0.1,
    cutoffHertz: 15e6,
    sourceOhms: 50,
    first: 'shunt',
  };
  const hertz = frequencyGrid(1e6, 60e6, 201);
  const base = {
    ladder: lowPassLadder(seven),
    capacitorToleranceRel: 0.05,
    inductorToleranceRel: 0.05,
    inductorQ: 180,
  };
  const built = (builds) => () => spreadBands(ladderBuilds({ ...base, builds, seed: 1 }, hertz));
  const [once, twice] = compared(built(1000), built(2000), 21);
  say(`Spread of 1,000 builds at 201 frequencies, 7 elements, with percentiles: ${once.toFixed(1)} ms`);
  say(`  2,000 builds: ${twice.toFixed(1)} ms; ratio ${(twice / once).toFixed(2)} (1.8 to 2.2)`);
}

/** Names the package offers, by the folder they come from; those at the top level count as the basics. */
function offeredByFamily() {
  const index = readFileSync(new URL('../src/index.ts', import.meta.url), 'utf8');
  const families = new Map();
  for (const [, names, from] of index.matchAll(/export \{([^}]*)\} from '\.\/([^']+)';/g)) {
    const family = from.includes('/') ? from.split('/')[0] : 'basics';
    const offered = names.split(',').map((name) => name.trim());
    families.set(family, [...(families.get(family) ?? []), ...offered.filter(Boolean)]);
  }
  return families;
}

/** Gzipped bytes of what a page gets that uses these names. */
async function gzipped({ rolldown }, names) {
  const index = new URL('../src/index.ts', import.meta.url).pathname;
  const page = `import { ${names.join(', ')} } from '${index}'; globalThis.used = [${names.join(', ')}];`;
  const plugin = {
    name: 'page',
    resolveId: (id) => (id === 'page' ? id : null),
    load: (id) => (id === 'page' ? page : null),
  };
  const { output } = await (
    await rolldown({ input: 'page', plugins: [plugin] })
  ).generate({ format: 'esm', minify: true });
  return gzipSync(output[0].code, { level: 9 }).length / 1000;
}

async function size() {
  const bundler = await optional('rolldown');
  if (bundler === undefined) return say('Size: no bundler installed, so not measured');
  const all = [...offeredByFamily().values()].flat();
  const pages = await addedToPages(bundler);
  const heaviest = Math.max(...pages.map(([, kilobytes]) => kilobytes));
  say(`What the package adds to a page of the portal, gzipped: ${heaviest.toFixed(1)} kB (25 at most)`);
  for (const [page, kilobytes] of pages.filter(([, kilobytes]) => kilobytes >= 0.05)) {
    say(`  ${page}: ${kilobytes.toFixed(1)} kB`);
  }
  const free = pages.filter(([, kilobytes]) => kilobytes < 0.05).map(([page]) => page);
  say(`  nothing: ${free.join(', ')}`);
  say(`All it offers, were it loaded at once: ${(await gzipped(bundler, all)).toFixed(1)} kB`);
}

products();
response();
spread();
await size();
