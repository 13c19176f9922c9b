import { defineConfig, globalIgnores } from 'eslint/config';
import pluginVue from 'eslint-plugin-vue';
import tseslint from 'typescript-eslint';
import vueParser from 'vue-eslint-parser';
import wringwall from './eslint.layers.js';

const noMarkedTests = {
  selector: 'MemberExpression[property.name=/^(skip|only|todo|skipIf|fails)$/][object.name=/^(it|test|describe)$/]',
  message: 'A test runs always, and all of it.',
};

/** How a template is laid out is for prettier to say. */
const prettiersOwn = Object.fromEntries(
  [
    'first-attribute-linebreak',
    'html-closing-bracket-newline',
    'html-indent',
    'html-self-closing',
    'max-attributes-per-line',
    'multiline-html-element-content-newline',
    'singleline-html-element-content-newline',
  ].map((rule) => [`vue/${rule}`, 'off']),
);

export default defineConfig(
  globalIgnores(['node_modules/', 'dist/', 'out/', 'coverage/', 'assets/']),
  {
    // A rule is obeyed or changed here, for all; never switched off beside the code that breaks it.
    linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
  },
  { files: ['**/*.js'], languageOptions: { globals: { process: 'readonly' } }, rules: { eqeqeq: 'error' } },
  {
    files: ['**/*.ts', '**/*.vue'],
    extends: [tseslint.configs.strictTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname, extraFileExtensions: ['.vue'] },
    },
    plugins: { wringwall },
    rules: {
      eqeqeq: 'error',
      'no-console': 'error',
      'no-param-reassign': 'error',
      'prefer-const': 'error',
      'wringwall/layers': 'error',
      '@typescript-eslint/ban-ts-comment': [
        'error',
        { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true },
      ],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'separate-type-imports' }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
    },
  },
  {
    files: ['renderer/**/*.vue'],
    extends: [pluginVue.configs['flat/recommended']],
    languageOptions: { parser: vueParser, parserOptions: { parser: tseslint.parser } },
    rules: {
      'max-lines': ['error', 300],
      // a property that may be left out says so by its type
      'vue/require-default-prop': 'off',
      ...prettiersOwn,
    },
  },
  {
    files: ['src/**/*.ts'],
    rules: {
      'max-lines': ['error', 170],
      'max-lines-per-function': ['error', 80],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'The engine gives the same answer twice.' },
        { object: 'Date', property: 'now', message: 'The engine does not know the time; the caller hands it in.' },
      ],
    },
  },
  {
    // `a[i]!` in a loop that is bounded by a.length says what a fallback value would hide.
    files: ['src/**/*.ts', 'test/**/*.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  { files: ['main/**/*.ts', 'renderer/**/*.ts'], rules: { 'max-lines': ['error', 300] } },
  {
    // These speak to a terminal, or listen to what is said there.
    files: ['main/cli/**/*.ts', 'main/start.ts', 'test/bench/**/*.ts', 'test/gate.ts', 'test/quiet.ts'],
    rules: { 'no-console': 'off' },
  },
  { files: ['test/**/*.ts'], rules: { 'no-restricted-syntax': ['error', noMarkedTests] } },
);
