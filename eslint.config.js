import vue from 'eslint-plugin-vue'
import tseslint from 'typescript-eslint'

/** Who may import whom: shared knows nobody; src and server meet only in shared. */
const forbid = (files, folders) => ({
  files,
  rules: {
    'no-restricted-imports': ['error', {
      patterns: folders.flatMap((folder) => [
        { group: [`#${folder}/*`, `**/${folder}/**`], message: `${files[0]} must not import from ${folder}/.` },
      ]),
    }],
  },
})

export default tseslint.config(
  { ignores: ['dist/', '.data/', 'db/migrations/', 'test-results/'] },
  ...tseslint.configs.recommended,
  ...vue.configs['flat/recommended'],
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: tseslint.parser } },
  },
  {
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
      'vue/html-closing-bracket-newline': 'off',
      'vue/html-indent': 'off',
      'vue/first-attribute-linebreak': 'off',
      'vue/multiline-html-element-content-newline': 'off',
      'vue/attributes-order': 'off',
      'vue/require-default-prop': 'off',
    },
  },
  forbid(['shared/**/*.ts'], ['server', 'src', 'db']),
  forbid(['src/**/*.{ts,vue}'], ['server', 'db']),
  forbid(['server/**/*.ts'], ['src']),
  forbid(['db/**/*.ts'], ['src']),
)
