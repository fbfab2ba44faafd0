import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

/** Zones of import/no-restricted-paths: what stands in `target` may not import from `from`. */
const walls = [
  {
    target: './geometry',
    from: '.',
    except: ['./geometry', './node_modules'],
    message: 'The kernel imports itself alone.',
  },
  {
    target: './entities',
    from: '.',
    except: ['./entities', './geometry', './node_modules'],
    message: 'Entities import the kernel alone.',
  },
  {
    target: './lib/schemas',
    from: '.',
    except: ['./lib/schemas', './geometry', './node_modules'],
    message: 'Schemas are shared with the browser: the kernel and other schemas alone.',
  },
  {
    target: './lib',
    from: ['./app', './components', './scripts', './tests'],
    message: 'Server code knows nothing of pages and screens.',
  },
  {
    target: './components',
    from: '.',
    except: ['./components', './geometry', './lib/schemas', './node_modules'],
    message: 'Screens import the kernel and lib/schemas; what the server has comes from app.',
  },
  {
    target: ['./app', './components', './migrations'],
    from: ['./scripts', './tests'],
    message: 'What is served does not depend on scripts or tests.',
  },
];

const nodeBuiltins = {
  group: ['node:*', 'fs', 'fs/*', 'path', 'crypto', 'os', 'process', 'child_process', 'url'],
  message: 'This also runs in the browser; it has no Node.',
};

const config = [
  {
    ignores: [
      // Wrong on purpose: tests/house/walls.test.ts sees it refused.
      'tests/house/circle/**',
      '.next*/**',
      '.data/**',
      'next-env.d.ts',
      'test-results/**',
      'playwright-report/**',
    ],
  },
  ...nextVitals,
  ...nextTypescript,
  {
    name: 'walls',
    files: ['**/*.{ts,tsx,mjs}'],
    settings: {
      'import/resolver': { typescript: { project: './tsconfig.json' } },
      // Packages are not read: no circle goes through one.
      'import/ignore': ['/node_modules/'],
      'import/cache': { lifetime: '∞' },
    },
    rules: {
      'import/no-restricted-paths': ['error', { basePath: import.meta.dirname, zones: walls }],
      'import/no-cycle': ['error', { ignoreExternal: true }],
      'import/no-self-import': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
    },
  },
  {
    name: 'kernel packages',
    files: ['geometry/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex:
                '^(?!\\.|@/geometry(/|$)|clipper2-ts$|makerjs$|dxf-writer(/|$)|dxf-parser$|mathjs/number$)',
              message:
                'The kernel uses clipper2-ts, makerjs, dxf-writer, dxf-parser and mathjs/number alone.',
            },
          ],
        },
      ],
      'no-restricted-globals': [
        'error',
        ...[
          'window',
          'document',
          'process',
          'Buffer',
          'fetch',
          'performance',
          'setTimeout',
        ].map((name) => ({ name, message: 'The kernel runs the same everywhere.' })),
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector:
            "MemberExpression[object.name='Math'][property.name='random'], NewExpression[callee.name='Date'], MemberExpression[object.name='Date'][property.name='now']",
          message: 'The same design gives the same plates: no chance, no clock.',
        },
      ],
    },
  },
  {
    name: 'browser code',
    files: ['components/**', 'lib/schemas/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            nodeBuiltins,
            {
              group: [
                '@mikro-orm/*',
                'pg',
                'pino',
                '@node-rs/*',
                'next-auth/jwt',
                'server-only',
              ],
              message: 'This is for the server.',
            },
            {
              group: ['three', 'three/*', '@react-three/*'],
              message: 'Only components/stack draws in 3D.',
            },
          ],
        },
      ],
    },
  },
  {
    name: '3D',
    files: ['components/stack/**'],
    rules: {
      'no-restricted-imports': ['error', { patterns: [nodeBuiltins] }],
      // three's cameras and objects are changed in place; that is how they are used.
      'react-hooks/immutability': 'off',
    },
  },
  {
    name: 'pages',
    files: ['app/**', 'lib/*.ts', 'entities/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['three', 'three/*', '@react-three/*'],
              message: 'Only components/stack draws in 3D.',
            },
          ],
        },
      ],
    },
  },
];

export default config;
