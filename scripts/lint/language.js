// The language rules: what may be written at all. Read by eslint.config.js.

const noEnums = { selector: 'TSEnumDeclaration', message: 'Use an `as const` object.' };

/** A check that is switched off, or that switches the others off, says nothing about the code. */
export const nothingLeftOut = [
  {
    selector:
      'MemberExpression[property.name=/^(only|skip|skipIf|runIf|todo|fixme|fails)$/]:matches([object.name=/^(it|test|describe|suite)$/], [object.property.name=/^(describe|each|concurrent)$/])',
    message: 'Every test runs: no only, skip, todo or fixme.',
  },
  {
    selector: 'CallExpression[callee.name=/^(fit|xit|fdescribe|xdescribe)$/]',
    message: 'Every test runs: no focused or excluded ones.',
  },
  noEnums,
];

export const language = {
  eqeqeq: 'error',
  'no-console': 'error',
  'no-constant-binary-expression': 'error',
  'no-debugger': 'error',
  'no-duplicate-imports': ['error', { allowSeparateTypeImports: true }],
  'no-else-return': 'error',
  'no-implicit-coercion': 'error',
  'no-param-reassign': 'error',
  'no-promise-executor-return': 'error',
  'no-restricted-syntax': ['error', noEnums],
  'no-self-compare': 'error',
  'no-template-curly-in-string': 'error',
  'no-unmodified-loop-condition': 'error',
  'no-unreachable-loop': 'error',
  'no-useless-assignment': 'error',
  'no-useless-rename': 'error',
  'no-var': 'error',
  'object-shorthand': 'error',
  'prefer-const': 'error',
  'prefer-template': 'error',
  complexity: ['error', 16],
  'max-depth': ['error', 4],
  'max-lines': ['error', { max: 300 }],
  'max-lines-per-function': ['error', { max: 70, skipBlankLines: true, skipComments: true }],
  'import-x/no-cycle': ['error', { ignoreExternal: true }],
  'import-x/no-self-import': 'error',
  'import-x/no-mutable-exports': 'error',
};

export const strictness = {
  '@typescript-eslint/consistent-type-imports': 'error',
  '@typescript-eslint/explicit-module-boundary-types': 'error',
  '@typescript-eslint/no-explicit-any': 'error',
  '@typescript-eslint/no-import-type-side-effects': 'error',
  '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
  '@typescript-eslint/ban-ts-comment': [
    'error',
    { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true, 'ts-check': false },
  ],
  '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
};
