import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

/**
 * Imports point one way; what a folder may import is listed, everything else is refused. The same rule is read from the
 * imports by a plain test, so that neither this file nor that test alone holds it.
 */
const outside = {
  browser: ['next/server', 'next/headers', 'pg', 'drizzle-orm', 'drizzle-orm/*', 'node:*', 'bcryptjs', 'iron-session', 'pino'],
};

const refuse = (groups, message) => ({ group: groups, message });

const zone = (files, patterns) => ({
  files,
  rules: { 'no-restricted-imports': ['error', { patterns }] },
});

const config = [
  { ignores: ['.next/**', '.rowrise/**', 'node_modules/**', 'coverage/**', 'next-env.d.ts', 'migrations/**', 'test-results/**', 'playwright-report/**'] },
  ...nextVitals,
  ...nextTypescript,
  {
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      eqeqeq: 'error',
      'no-console': 'error',
    },
  },
  // Scripts speak to the person who started them.
  { files: ['scripts/**', 'db/demo/fill.ts', 'tests/**'], rules: { 'no-console': 'off' } },
  zone(['app/**'], [refuse(['@/db/*', 'drizzle-orm', 'drizzle-orm/*', 'pg'], 'Pages and routes call services; only lib/server reaches the database.')]),
  zone(['components/**'], [
    refuse(['@/lib/server/*', '@/lib/server', '@/db/*', '@/app/*', ...outside.browser], 'Components take data; they do not reach the server, the database or pages.'),
    refuse(['@/lib/agronomy/inference/*', '@/lib/agronomy/pool-scores', '@/lib/agronomy/timing-of-strips', '@/lib/agronomy/pool-stand'], 'Inference stays on the server.'),
  ]),
  // A later entry for the same file replaces an earlier one whole, so the narrower folder comes after and says everything.
  zone(['components/ui/**'], [refuse(['@/lib/agronomy/*', '@/lib/server/*', '@/lib/client/*', '@/db/*', '@/app/*', ...outside.browser], 'components/ui knows no domain and no server.')]),
  zone(['lib/client/**'], [
    refuse(['@/lib/server/*', '@/db/*', '@/app/*', '@/components/*', ...outside.browser], 'Browser code does not reach the server.'),
    refuse(['@/lib/agronomy/inference/*', '@/lib/agronomy/pool-scores'], 'Inference stays on the server.'),
  ]),
  zone(['lib/schemas/**', 'lib/access/**', 'lib/errors/**', 'lib/format/**', 'lib/paths/**', 'lib/texts/**'], [
    refuse(['@/lib/server/*', '@/lib/client/*', '@/db/*', '@/app/*', '@/components/*', ...outside.browser], 'Universal code stands below server and browser alike.'),
  ]),
  zone(['lib/agronomy/**'], [
    refuse(['@/*', 'next', 'next/*', 'react', 'react-dom', 'zod', 'pg', 'drizzle-orm', 'drizzle-orm/*', 'node:*'], 'The core imports itself and numeric libraries only.'),
  ]),
  zone(['lib/server/**'], [refuse(['@/app/*', '@/components/*', '@/lib/client/*'], 'The server does not know pages or browser code.')]),
  zone(['lib/server/services/**'], [
    refuse(['drizzle-orm', 'drizzle-orm/*', 'pg', '@/db/schema/*'], 'A query stands in lib/server/data.'),
    refuse(['@/app/*', '@/components/*', '@/lib/client/*'], 'The server does not know pages or browser code.'),
  ]),
  zone(['db/schema/**'], [refuse(['@/app/*', '@/components/*', '@/lib/server/*', '@/lib/client/*', '@/lib/agronomy/*'], 'Tables know the shared vocabulary only.')]),
];

export default config;
