import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Modules the engine must not know: it takes values and returns values. */
const ENGINE_FENCE = {
  patterns: [
    {
      group: ['@nestjs/*', 'sequelize*', 'sqlite3', 'express', 'axios', 'pino*', 'piscina'],
      message: 'The engine is plain TypeScript: hand it values instead.',
    },
    {
      group: ['fs', 'node:*', 'http', 'https', 'net', 'worker_threads', 'crypto', 'child_process'],
      message: 'The engine touches no file, network, clock or process.',
    },
    {
      group: ['../../*/../**', '**/cases/**', '**/database/**', '**/auth/**'],
      message: 'The engine imports nothing from the service around it.',
    },
  ],
};

export default tseslint.config(
  {
    ignores: [
      '**/dist/',
      '**/node_modules/',
      '**/coverage/',
      'ui/src/lib/api-types.ts',
      'service/data/',
      'ui/e2e/output/',
    ],
  },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    languageOptions: { globals: { ...globals.node } },
    rules: {
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'inline-type-imports', prefer: 'type-imports' },
      ],
      'no-console': 'error',
      eqeqeq: 'error',
    },
  },
  {
    // Nest reads constructor parameter types at run time, so its imports must stay values.
    files: [
      'service/src/**/*.{controller,service,module,guard,filter,interceptor,model,dto,gateway,strategy}.ts',
      'service/test/**/*.ts',
    ],
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    files: ['service/src/engine/**/*.ts'],
    rules: {
      'no-restricted-imports': ['error', ENGINE_FENCE],
      'no-restricted-globals': [
        'error',
        'process',
        'performance',
        'fetch',
        'setTimeout',
        'setInterval',
        'Buffer',
        'require',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Hand the engine a seeded generator.' },
        { object: 'Date', property: 'now', message: 'The engine has no clock.' },
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "NewExpression[callee.name='Date']", message: 'The engine has no clock.' },
      ],
    },
  },
  {
    // Its specs may read files and compare with outside libraries.
    files: ['service/src/engine/**/*.spec.ts', 'service/src/engine/**/testing/**/*.ts'],
    rules: { 'no-restricted-imports': 'off', 'no-restricted-globals': 'off' },
  },
  {
    files: ['service/src/**/*.ts'],
    ignores: ['service/src/engine/**', 'service/src/**/*.spec.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['**/engine/*', '!**/engine/index', '!**/engine/units', '!**/engine/netlist'],
              message: 'Import from engine/index: it is the only door.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['ui/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: { ...globals.browser } },
    rules: {
      ...reactHooks.configs.recommended.rules,
      'no-restricted-syntax': [
        'error',
        {
          selector: 'ExportDefaultDeclaration',
          message: 'Named exports only, so that a thing has one name.',
        },
      ],
    },
  },
  {
    // A feature never imports another; a route joins them.
    files: ['ui/src/features/**/*.{ts,tsx}'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex: '^@/(routes|app/(App|AppProviders|router))',
              message: 'Code flows shared, features, routes; not back.',
            },
          ],
        },
      ],
    },
  },
  {
    files: [
      '**/*.config.{ts,mjs,js}',
      '**/*.mjs',
      'service/src/cli/**',
      'service/bench/**',
      'service/src/main.ts',
    ],
    rules: { 'no-console': 'off', 'no-restricted-syntax': 'off' },
  },
  prettier,
);
