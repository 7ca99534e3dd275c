import { defineConfig, globalIgnores } from 'eslint/config';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTs from 'eslint-config-next/typescript';

/** The walls between the layers: what each folder may not import (DEVELOPERS.md, "Layers"). */
const wall = (files, groups, why) => {
  // '@/server/*' and the same place by a relative path.
  const layers = groups
    .filter((group) => group.startsWith('@/'))
    .map((group) => group.split('/')[1]);
  const climbing = { regex: `^(\\.\\./)+(${layers.join('|')})/`, message: why };
  return {
    files,
    ignores: ['**/*.test.ts', '**/*.test.tsx'],
    rules: {
      'no-restricted-imports': ['error', { patterns: [{ group: groups, message: why }, climbing] }],
    },
  };
};

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  globalIgnores(['.next/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'db/migrations/**']),
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
    },
  },
  wall(
    ['lib/**'],
    [
      '@/app/*',
      '@/components/*',
      '@/db/*',
      '@/server/*',
      'react',
      'react-dom',
      'next',
      'next/*',
      'drizzle-orm*',
      'socket.io*',
      'node:*',
      'fs',
      'path',
    ],
    'lib is pure computation: no I/O, no framework, nothing of ours outside lib.',
  ),
  wall(
    ['db/**'],
    ['@/app/*', '@/components/*', '@/server/*', 'react', 'next', 'next/*'],
    'db knows lib only.',
  ),
  wall(
    ['server/**'],
    ['@/app/*', '@/components/*', 'react', 'react-dom'],
    'server knows db and lib only.',
  ),
  wall(
    ['components/**'],
    ['@/app/*', '@/db/*', '@/server/*', 'drizzle-orm*'],
    'components know lib only: view models come in as props.',
  ),
  wall(
    ['app/**'],
    ['@/db/*', 'drizzle-orm*'],
    'routes read through server/queries and write through server/commands.',
  ),
  {
    // Computation takes its clock and its randomness as arguments.
    files: ['lib/**'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'A clock is handed in.' },
        { object: 'Math', property: 'random', message: 'Randomness is handed in (a seed).' },
        { object: 'performance', property: 'now', message: 'A clock is handed in.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: 'A clock is handed in.',
        },
      ],
    },
  },
]);
