import tseslint from 'typescript-eslint';

const typed = tseslint.configs.strictTypeChecked.map((config) => ({ ...config, files: ['**/*.{ts,tsx}'] }));

export default tseslint.config(
  { ignores: ['dist/**', 'node_modules/**', '**/*.generated.ts'] },
  ...typed,
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true, allowBoolean: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/prefer-nullish-coalescing': 'off',
      '@typescript-eslint/no-unnecessary-condition': ['error', { allowConstantLoopConditions: true }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      '@typescript-eslint/no-invalid-void-type': 'off',
      '@typescript-eslint/unified-signatures': 'off',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/only-throw-error': ['error', { allow: [{ from: 'file', name: 'CellFault' }] }],
      'no-restricted-syntax': [
        'error',
        { selector: "CallExpression[callee.name='eval']", message: 'workbook text is never evaluated as code' },
        { selector: "NewExpression[callee.name='Function']", message: 'workbook text is never evaluated as code' },
      ],
    },
  },
  {
    // The host's own type for a matrix of anything is any[][]; the metadata generator knows no other.
    files: ['functions/*.ts'],
    rules: { '@typescript-eslint/no-explicit-any': 'off', '@typescript-eslint/no-unsafe-return': 'off' },
  },
  {
    files: ['core/**/*.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        ...[
          'window',
          'document',
          'console',
          'fetch',
          'localStorage',
          'process',
          'setTimeout',
          'setInterval',
          'performance',
          'Office',
          'Excel',
          'CustomFunctions',
          'require',
        ].map((name) => ({ name, message: 'core is pure: no DOM, host, clock, console or I/O' })),
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'core has no clock' },
        { object: 'Math', property: 'random', message: 'core is deterministic' },
      ],
    },
  },
  {
    files: ['test/**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
    },
  },
);
