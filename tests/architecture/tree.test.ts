import { describe, expect, it } from "vitest";
import { files, matching, read, textFiles, top } from "@/tests/architecture/tree";

const FOLDERS = [".ci", "app", "components", "db", "lib", "public", "scripts", "tests"];
const DOCUMENTS = ["DEVELOPERS.md", "LICENSE", "README.md"];
const CONFIGURATION =
  /^(package(-lock)?\.json|tsconfig\.json|knip\.json|\.(gitignore|npmrc|nvmrc|prettierignore|editorconfig|gitattributes)|\.dependency-cruiser\.cjs|[a-z]+\.config\.(ts|mjs)|instrumentation\.ts|proxy\.ts)$/;
/** Names that say nothing about what is inside. Under /types the catalogue's bolt types are shown. */
const ATTICS = /(^|\/)(src|utils|helpers|hooks|(?<!^app\/\(register\)\/)types|services|docs|misc)\//;
/** Layers that must never reach a browser. */
const SERVER =
  /^(db\/(client|migrate)\.ts|db\/repositories\/|lib\/(commands|queries|http|auth|config|mail|storage)\/)/;
const CODE = /\.(ts|tsx|mjs|cjs)$/;

// Put together here so that this file does not contain what it looks for.
const any = (...words: string[]) => new RegExp(words.join("|"));
const MACHINE_PATHS = any("/wor" + "k/", "/roo" + "t/", "/hom" + "e/", "/User" + "s/", "C:" + "\\\\");
const SWITCHES = any("eslint-" + "disable", "@ts-" + "ignore", "@ts-" + "expect-error", "@ts-" + "nocheck");
const NOT_RUN = any(
  "\\b(it|test|describe)\\.(ski" + "p|onl" + "y|tod" + "o|fixm" + "e|fail" + "s)\\b",
  "\\bx(it|describe)\\(",
);

describe("the tree", () => {
  it("has the agreed folders at the top, and files of configuration beside the documents", () => {
    const isFolder = (name: string) => files().some((file) => file.startsWith(`${name}/`));
    expect(top().filter(isFolder)).toEqual(FOLDERS);
    const others = top().filter((name) => !isFolder(name));
    expect(others.filter((name) => !DOCUMENTS.includes(name) && !CONFIGURATION.test(name))).toEqual([]);
  });

  it("has no folder whose name says nothing", () => {
    expect(files().filter((file) => ATTICS.test(file))).toEqual([]);
  });

  it("names code files in kebab-case", () => {
    const code = files().filter((file) => CODE.test(file) && !file.startsWith("."));
    const name = (file: string) =>
      (file.split("/").at(-1) ?? file).replace(
        /\.(every\.spec|phone\.spec|test|spec|config|setup)(?=\.)/,
        "",
      );
    expect(code.filter((file) => !/^[a-z0-9]+(-[a-z0-9]+)*\.[a-z]+$/.test(name(file)))).toEqual([]);
  });
});

describe("the layers", () => {
  it("of the server begin with the guard that keeps them out of browsers", () => {
    const server = files().filter((file) => SERVER.test(file) && file.endsWith(".ts"));
    expect(server.length).toBeGreaterThan(80);
    const firstLine = (file: string) => read(file).split("\n")[0];
    expect(server.filter((file) => firstLine(file) !== 'import "server-only";')).toEqual([]);
  });

  it("read the environment in one place", () => {
    const code = files().filter((file) => /^(app|components|db|lib)\//.test(file) && CODE.test(file));
    expect(matching(code, /process\.env/)).toEqual(["lib/config/env.ts"]);
  });

  it("know SQL in one place", () => {
    const outside = files().filter((file) => /^(app|components|lib|scripts)\//.test(file) && CODE.test(file));
    expect(matching(outside, /from "(drizzle-orm|postgres)/)).toEqual([]);
  });
});

describe("the checks", () => {
  it("are switched off nowhere", () => {
    expect(matching(textFiles(), SWITCHES)).toEqual([]);
  });

  it("leave no test out", () => {
    expect(
      matching(
        files().filter((file) => /\.(test|spec)\.tsx?$/.test(file)),
        NOT_RUN,
      ),
    ).toEqual([]);
  });
});

describe("the repository", () => {
  it("names no folder of a machine it was written on", () => {
    expect(matching(textFiles(), MACHINE_PATHS)).toEqual([]);
  });

  it("locks packages without saying where they were fetched from", () => {
    expect(read("package-lock.json")).not.toMatch(/"resolved"|https?:\/\/[^"]*registry/);
  });

  it("pins every package to one version", () => {
    const {
      dependencies,
      devDependencies,
    }: Record<string, Record<string, string>> = JSON.parse(read("package.json"));
    const versions = Object.entries({ ...dependencies, ...devDependencies });
    expect(versions.length).toBeGreaterThan(30);
    expect(versions.filter(([, version]) => !/^\d+\.\d+\.\d+$/.test(version))).toEqual([]);
  });

  it("lists every migration in the journal, in order", () => {
    const journal: { entries: { tag: string; when: number }[] } = JSON.parse(
      read("db/migrations/meta/_journal.json"),
    );
    const sql = files("db/migrations").filter((file) => file.endsWith(".sql"));
    expect(journal.entries.map(({ tag }) => `db/migrations/${tag}.sql`)).toEqual(sql.toSorted());
    const times = journal.entries.map(({ when }) => when);
    expect(times).toEqual(times.toSorted((a, b) => a - b));
  });
});
