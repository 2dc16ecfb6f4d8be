import prettier from 'eslint-config-prettier'
import vue from 'eslint-plugin-vue'
import accessibility from 'eslint-plugin-vuejs-accessibility'
import globals from 'globals'
import typescript from 'typescript-eslint'
import { defineConfig, globalIgnores } from 'eslint/config'

const TYPED_FILES = ['**/*.ts', '**/*.vue']

export default defineConfig(
  globalIgnores(['node_modules', '.nuxt', '.output', '.data', 'test-results', 'drizzle', 'public']),
  { linterOptions: { reportUnusedDisableDirectives: 'error', noInlineConfig: true } },
  typescript.configs.strict,
  vue.configs['flat/recommended'],
  accessibility.configs['flat/recommended'],
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: typescript.parser } },
  },
  {
    files: TYPED_FILES,
    rules: {
      // TypeScript itself finds unknown names, and it knows the ones Nuxt brings in.
      'no-undef': 'off',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
    },
  },
  {
    files: ['**/*.mjs'],
    languageOptions: { globals: globals.node },
    rules: { 'no-undef': 'error' },
  },
  {
    rules: {
      eqeqeq: 'error',
      'no-console': 'off',
      'no-var': 'error',
      'prefer-const': 'error',
    },
  },
  {
    files: ['**/*.vue'],
    rules: {
      // Nuxt names a component by its folders and its file, a page by its address.
      'vue/multi-word-component-names': 'off',
      'vue/component-api-style': ['error', ['script-setup']],
      'vue/define-props-declaration': ['error', 'type-based'],
      'vue/define-emits-declaration': ['error', 'type-based'],
      'vue/no-v-html': 'error',
      'vue/require-default-prop': 'off',
      'vuejs-accessibility/label-has-for': ['error', { required: { some: ['nesting', 'id'] } }],
    },
  },
  prettier,
)
