// @ts-check
import withNuxt from './.nuxt/eslint.config.mjs'

const commands = ['scripts/**', 'bench/**']
const serverBoot = ['server/plugins/**', 'server/demo/**']

export default withNuxt(
  { ignores: ['.cache/**', '.data/**', 'coverage/**', 'public/**', 'server/uploads/**', 'test-results/**'] },
  {
    name: 'stillroot/everywhere',
    rules: {
      // What a person typed is shown as text, never as markup.
      'vue/no-v-html': 'error',
      'no-console': 'error',
      'eqeqeq': ['error', 'always'],
      'prefer-const': 'error',
      // How many attributes fit on a line is a matter of their length, which these two cannot see.
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      '@stylistic/operator-linebreak': ['error', 'before', { overrides: { '=': 'after' } }],
      '@stylistic/multiline-ternary': 'off',
    },
  },
  {
    name: 'stillroot/types',
    files: ['**/*.ts', '**/*.vue'],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
    },
  },
  {
    // Outside tests a type is earned by a check, never claimed.
    name: 'stillroot/no-claims',
    files: ['**/*.ts', '**/*.vue'],
    ignores: ['tests/**'],
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-assertions': ['error', { assertionStyle: 'never' }],
    },
  },
  {
    // Here the console is the screen.
    name: 'stillroot/console-allowed',
    files: [...commands, ...serverBoot],
    rules: { 'no-console': 'off' },
  },
)
