// Makes the worker that keeps the field page on a phone: bundles it with the list of that page's files, each by its hash.
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { build as bundle } from 'esbuild';
import { checkout } from './places.mjs';

const built = join(checkout, '.next');
const html = () => readFileSync(join(built, 'server', 'app', 'round.html'), 'utf8');
const sha256 = (bytes, form) => createHash('sha256').update(bytes).digest(form);

/** The addresses under /_next/static that a text names. */
const namedIn = (text) => [...text.matchAll(/\/_next\/static\/[\w./~-]+\.(?:js|css|woff2)/g)].map(([address]) => address);

const fileOf = (address) =>
  address.startsWith('/_next/static/')
    ? join(built, 'static', address.slice('/_next/static/'.length))
    : join(checkout, 'public', address);

/** What the field page needs to open without a network, and nothing of the other pages. */
export function roundFiles() {
  const page = html();
  const first = [...new Set(namedIn(page))].filter((address) => existsSync(fileOf(address)));
  const fonts = first
    .filter((address) => address.endsWith('.css'))
    .flatMap((address) =>
      [...readFileSync(fileOf(address), 'utf8').matchAll(/url\(["']?(?:\.\.\/media|\/_next\/static\/media)\/([\w.~-]+)["']?\)/g)].map(
        ([, name]) => `/_next/static/media/${name}`,
      ),
    );
  // A worker of the build tool itself would be named here too; there is none.
  const addresses = [...new Set([...first, ...fonts, '/theme.js', '/round.webmanifest', ...icons()])];
  return [
    { url: '/round', bytes: Buffer.from(page) },
    ...addresses.map((url) => ({ url, bytes: readFileSync(fileOf(url)) })),
  ];
}

const icons = () => readdirSync(join(checkout, 'public')).filter((name) => name.startsWith('round-icon-')).map((name) => `/${name}`);

/** The hash is the revision and the integrity: what a network's sign-in page says in the place of a file is not kept. */
const precached = ({ url, bytes }) => ({ url, revision: sha256(bytes, 'hex').slice(0, 20), integrity: `sha256-${sha256(bytes, 'base64')}` });

export async function makeRoundWorker() {
  await bundle({
    entryPoints: [join(checkout, 'lib/client/round/worker/round-worker.ts')],
    outfile: join(built, 'round-worker.js'),
    bundle: true,
    minify: true,
    format: 'iife',
    target: 'es2020',
    legalComments: 'none',
    define: { ROUND_FILES: JSON.stringify(roundFiles().map(precached)), 'process.env.NODE_ENV': '"production"' },
    logLevel: 'warning',
  });
}
