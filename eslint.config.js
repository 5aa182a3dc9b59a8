import eslint from '@eslint/js';
import { defineConfig, globalIgnores } from 'eslint/config';
import tseslint from 'typescript-eslint';

const geometryEngines = [
  { name: 'paper', message: 'Paper is named only in shared/geometry and the canvas.' },
  { name: 'clipper2-ts', message: 'Clipper is named only in shared/geometry.' },
];

/** Their author has ended development: two small modules stand between them and the rest. */
const signIn = [
  { group: ['lucia', '@lucia-auth/*'], message: 'Sessions are kept by server/http/session.ts.' },
  {
    group: ['oslo', 'oslo/*'],
    message: 'Only session.ts and passwords.ts of server/http use oslo.',
  },
];

/** `as` may only be what a named function gives back, so that every assertion has a name. */
const namedAssertions = {
  selector:
    'TSAsExpression:not([typeAnnotation.typeName.name="const"])' +
    ':not(FunctionDeclaration > BlockStatement > ReturnStatement > TSAsExpression)' +
    ':not(VariableDeclarator > ArrowFunctionExpression > TSAsExpression)',
  message: 'Put the assertion in a small named function that says why it is true.',
};

export default defineConfig(
  globalIgnores(['dist/', '.ellwand/', 'coverage/', 'test-results/', 'playwright-report/']),
  eslint.configs.recommended,
  tseslint.configs.strictTypeChecked,
  {
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      'max-lines': ['error', { max: 300 }],
      'no-restricted-syntax': ['error', namedAssertions],
      'no-restricted-imports': [
        'error',
        {
          paths: geometryEngines,
          patterns: [
            {
              group: ['paper/*'],
              message: 'Paper is named only in shared/geometry and the canvas.',
            },
            ...signIn,
          ],
        },
      ],
      eqeqeq: 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { ignoreRestSiblings: true }],
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-assertions': [
        'error',
        { assertionStyle: 'as', objectLiteralTypeAssertions: 'never' },
      ],
      '@typescript-eslint/consistent-type-definitions': ['error', 'type'],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-misused-spread': ['error', { allow: ['string'] }],
      '@typescript-eslint/triple-slash-reference': ['error', { path: 'always' }],
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      '@typescript-eslint/no-confusing-void-expression': [
        'error',
        { ignoreArrowShorthand: true, ignoreVoidReturningFunctions: true },
      ],
    },
  },
  {
    files: [
      'shared/geometry/**',
      'src/**/canvas/**',
      'tests/geometry/**',
      'tests/bench/**',
      'server/http/{session,passwords}.ts',
    ],
    rules: { 'no-restricted-imports': 'off' },
  },
  {
    // Vitest's table of provided values and lucia's of attributes can only be added to as an interface.
    files: ['tests/server/support/**', 'server/http/session.ts'],
    rules: { '@typescript-eslint/consistent-type-definitions': 'off' },
  },
  {
    files: ['**/*.mjs', '**/*.js'],
    rules: { 'no-undef': 'off' },
  },
);
