import { defineConfig, globalIgnores } from "eslint/config";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTs from "eslint-config-next/typescript";
import boundaries from "eslint-plugin-boundaries";

// layer -> the layers it may import (a layer may always import itself)
const mayImport = {
  app: [
    "components",
    "commands",
    "queries",
    "http",
    "auth",
    "schemas",
    "policy",
    "domain",
    "map",
    "offline",
    "config",
    "shared",
  ],
  components: ["policy", "domain", "engineering", "schemas", "map", "offline", "shared"],
  http: ["auth", "policy", "schemas", "config", "shared"],
  commands: [
    "db",
    "auth",
    "mail",
    "storage",
    "policy",
    "domain",
    "engineering",
    "schemas",
    "config",
    "shared",
  ],
  queries: ["db", "policy", "domain", "engineering", "schemas", "config", "shared"],
  auth: ["db", "policy", "config", "shared"],
  mail: ["domain", "config", "shared"],
  storage: ["domain", "config", "shared"],
  db: ["domain", "config", "shared"],
  offline: ["schemas", "domain", "shared"],
  map: ["domain", "shared"],
  schemas: ["domain", "shared"],
  policy: ["domain", "shared"],
  domain: ["engineering", "shared"],
  engineering: ["shared"],
  config: ["shared"],
  shared: [],
};

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  globalIgnores([".next/**", ".next-*/**", ".local/**", "next-env.d.ts", "db/migrations/**", "public/**"]),
  {
    files: ["app/**", "components/**", "lib/**", "db/**"],
    plugins: { boundaries },
    settings: {
      "import/resolver": { typescript: { alwaysTryTypes: true } },
      "boundaries/elements": Object.keys(mayImport).map((type) => ({
        type,
        pattern: ["app", "components", "db"].includes(type) ? type : `lib/${type}`,
      })),
    },
    rules: {
      "boundaries/no-unknown-files": "error",
      "boundaries/dependencies": [
        "error",
        {
          default: "disallow",
          policies: Object.entries(mayImport).map(([from, to]) => ({
            from: { element: { type: from } },
            allow: { to: { element: { types: { anyOf: [from, ...to] } } } },
          })),
        },
      ],
    },
  },
  {
    files: ["app/**", "components/**", "lib/**"],
    ignores: ["lib/config/**"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            { group: ["drizzle-orm", "drizzle-orm/*", "postgres", "pg"], message: "SQL lives in db/." },
          ],
        },
      ],
      "no-restricted-properties": [
        "error",
        { object: "process", property: "env", message: "Read env through lib/config/env.ts." },
      ],
    },
  },
  {
    // Commands are told who acts: of auth they take hashing and secrets, never a session.
    files: ["lib/commands/**"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            { group: ["drizzle-orm", "drizzle-orm/*", "postgres", "pg"], message: "SQL lives in db/." },
            {
              regex: "^@/lib/auth/(?!password$|secrets$)",
              message: "A command gets its actor from the door.",
            },
          ],
        },
      ],
    },
  },
  {
    files: ["lib/engineering/**", "lib/domain/**", "lib/policy/**", "lib/shared/**"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            {
              group: [
                "drizzle-orm",
                "drizzle-orm/*",
                "postgres",
                "pg",
                "next",
                "next/*",
                "next-auth",
                "react",
                "react-dom",
                "maplibre-gl",
                "zod",
                "node:*",
                "server-only",
              ],
              message: "Pure layer: no framework, database or I/O imports.",
            },
          ],
        },
      ],
      "no-restricted-globals": [
        "error",
        "fetch",
        "process",
        "window",
        "document",
        "localStorage",
        "indexedDB",
        "crypto",
        "setTimeout",
        "console",
      ],
      "no-restricted-properties": [
        "error",
        { object: "Date", property: "now", message: "Take `now` as a parameter." },
        { object: "Math", property: "random", message: "Take the value as a parameter." },
        { object: "performance", property: "now" },
      ],
      "no-restricted-syntax": [
        "error",
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: "Take `now` as a parameter.",
        },
      ],
    },
  },
  {
    files: ["app/**/actions.ts"],
    rules: {
      "no-restricted-syntax": [
        "error",
        {
          selector: "ExportNamedDeclaration > FunctionDeclaration",
          message: "A server action is a public endpoint: build it with action().",
        },
        {
          selector:
            "ExportNamedDeclaration > VariableDeclaration > VariableDeclarator > :not(Identifier):not(CallExpression[callee.name='action'])",
          message: "A server action is a public endpoint: build it with action().",
        },
        { selector: "ExportDefaultDeclaration", message: "Named exports only." },
      ],
    },
  },
  {
    files: ["app/**/route.ts"],
    ignores: ["app/sw.js/route.ts", "app/api/auth/**"],
    rules: {
      "no-restricted-syntax": [
        "error",
        {
          selector: "ExportNamedDeclaration > FunctionDeclaration",
          message: "Build a route handler with route() or tileRoute().",
        },
        {
          selector:
            "ExportNamedDeclaration VariableDeclarator[id.name=/^(GET|POST|PUT|PATCH|DELETE)$/] > :not(Identifier):not(CallExpression[callee.name=/^(route|tileRoute)$/])",
          message: "Build a route handler with route() or tileRoute().",
        },
      ],
    },
  },
  {
    files: ["**/*.{ts,tsx}"],
    rules: {
      "max-lines": ["error", { max: 300, skipBlankLines: true, skipComments: true }],
      "max-lines-per-function": ["warn", { max: 60, skipBlankLines: true, skipComments: true }],
      complexity: ["warn", 12],
      "@typescript-eslint/consistent-type-imports": "error",
      "@typescript-eslint/no-explicit-any": "error",
      // `{ left: _left, ...rest }` is how a field is left out.
      "@typescript-eslint/no-unused-vars": ["warn", { ignoreRestSiblings: true }],
      "@typescript-eslint/no-non-null-assertion": "error",
      "no-console": "error",
    },
  },
  {
    files: ["app/**/{actions,route}.ts"],
    rules: { "max-lines": ["error", { max: 80, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ["app/**/{page,layout}.tsx"],
    rules: { "max-lines": ["error", { max: 150, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ["**/*.{ts,tsx}"],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      "@typescript-eslint/no-floating-promises": "error",
      "@typescript-eslint/no-misused-promises": "error",
      "@typescript-eslint/switch-exhaustiveness-check": "error",
    },
  },
]);
