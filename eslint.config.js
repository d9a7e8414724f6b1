import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import { defineConfig, globalIgnores } from 'eslint/config';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

/**
 * Direction of imports: engine ← plan ← words ← {shelf, workspace, cli} ← routes; charts stands alone.
 * A room may import itself and what it lists here, nothing else of the project.
 */
const MAY_IMPORT = {
  engine: [],
  plan: ['engine'],
  words: ['engine', 'plan'],
  charts: [],
  shelf: ['engine', 'plan', 'words'],
  workspace: ['engine', 'plan', 'words', 'charts', 'shelf'],
  cli: ['engine', 'plan', 'words'],
  routes: ['engine', 'plan', 'words', 'charts', 'shelf', 'workspace']
};
const ROOMS = Object.keys(MAY_IMPORT);

/** Packages a room may import (regular expressions); a room not named here may import any. */
const PACKAGES = {
  engine: { allowed: [], message: 'engine/ is pure numbers: it imports nothing but itself' },
  plan: { allowed: ['zod($|/)'], message: 'plan/ imports zod and the engine alone' },
  words: { allowed: [], message: 'words/ imports the plan and the engine alone' },
  charts: { allowed: ['d3$', 'svelte($|/)'], message: 'charts/ imports d3 and svelte alone' },
  cli: {
    allowed: ['node:'],
    message: 'cli/ runs in plain Node: it imports the engine, the plan, the words and Node'
  }
};

/** Rooms that load nothing on demand: an import that hides in an expression would slip past the fence. */
const NEVER_LATE = ['engine', 'plan', 'words', 'charts'];

/** What the engine must not know: the screen, the clock, chance, the machine, the log. */
const OUTSIDE = [
  ...['window', 'document', 'navigator', 'location', 'localStorage', 'sessionStorage', 'indexedDB'],
  ...['globalThis', 'global', 'self', 'process', 'require', 'Buffer', 'console', 'Worker', 'crypto', 'fetch'],
  ...['Date', 'Temporal', 'performance', 'setTimeout', 'setInterval', 'setImmediate', 'queueMicrotask'],
  ...['requestAnimationFrame', 'XMLHttpRequest', 'WebSocket', 'Intl']
];

const D3_MESSAGE = 'import names from d3: the whole of it is seven times the size';
const WHOLE_D3 = [
  { selector: "ImportDeclaration[source.value='d3'] > ImportNamespaceSpecifier", message: D3_MESSAGE },
  { selector: "ImportDeclaration[source.value='d3'] > ImportDefaultSpecifier", message: D3_MESSAGE },
  { selector: "ExportAllDeclaration[source.value='d3']", message: D3_MESSAGE },
  { selector: "ImportExpression[source.value='d3']", message: D3_MESSAGE }
];

/** Matches an import of one of the rooms, by alias, by relative path or from the project's root; `./words` is a file. */
function pathInto(rooms) {
  return `^(?!\\./[^/]+$)(\\$lib|\\.{1,2}|/?src)/(.*/)?(${rooms.join('|')})(/|$)`;
}

/** Imports that hide in an expression or a type, held to the same paths (a selector's pattern may hold no slash). */
function hiddenImports(room, regex, message) {
  const source = NEVER_LATE.includes(room) ? '' : `[source.value=/${regex.replaceAll('/', '\\u002F')}/]`;
  return [
    { selector: `ImportExpression${source}`, message },
    { selector: `TSImportType${source}`, message }
  ];
}

function fence(room) {
  const dir = room === 'cli' || room === 'routes' ? `src/${room}` : `src/lib/${room}`;
  const regex = pathInto(ROOMS.filter((other) => other !== room && !MAY_IMPORT[room].includes(other)));
  const message = `${room}/ may import ${[room, ...MAY_IMPORT[room]].join(', ')} alone (DEVELOPERS.md, direction of imports)`;
  const patterns = [{ regex, message }];
  const packages = PACKAGES[room];
  if (packages) {
    const own = ['\\.{1,2}/', '\\$lib/', ...packages.allowed];
    patterns.push({ regex: `^(?!${own.join('|')})`, message: packages.message });
  }
  return {
    files: [`${dir}/**/*.{ts,js,mjs,svelte}`],
    rules: {
      '@typescript-eslint/no-restricted-imports': ['error', { patterns }],
      'no-restricted-syntax': ['error', ...WHOLE_D3, ...hiddenImports(room, regex, message)]
    }
  };
}

export default defineConfig(
  globalIgnores(['build/', '.svelte-kit/', 'dist/', 'test-results/', 'coverage/']),
  js.configs.recommended,
  ts.configs.recommended,
  svelte.configs.recommended,
  prettier,
  svelte.configs.prettier,
  {
    languageOptions: { globals: { ...globals.browser, ...globals.node } },
    rules: {
      'no-undef': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      'no-restricted-syntax': ['error', ...WHOLE_D3]
    }
  },
  {
    files: ['**/*.svelte', '**/*.svelte.ts'],
    languageOptions: {
      parserOptions: {
        projectService: true,
        extraFileExtensions: ['.svelte'],
        parser: ts.parser,
        svelteConfig
      }
    }
  },
  ...ROOMS.map(fence),
  {
    files: ['src/lib/engine/**'],
    rules: {
      'no-restricted-globals': ['error', ...OUTSIDE],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'the engine has no randomness without a seed' }
      ]
    }
  }
);
