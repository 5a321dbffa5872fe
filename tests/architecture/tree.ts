import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";

const root = path.join(import.meta.dirname, "..", "..");

/** Made by tools, never part of the repository. */
const MADE = /^(\.git|\.local|\.next.*|node_modules|coverage|test-results|playwright-report|public\/vendor)$/;
const MADE_FILES = /^(next-env\.d\.ts|.*\.tsbuildinfo|\.env.*\.local|\.DS_Store)$/;
const TEXT = /\.(ts|tsx|mjs|cjs|js|css|json|md|sql|svg|yml|yaml|html|geojson)$|^\.ci\/run$/;

/** Every file of the repository, as paths with forward slashes from its top. */
export function files(below = ""): string[] {
  return readdirSync(path.join(root, below), { withFileTypes: true }).flatMap((entry) => {
    const name = below === "" ? entry.name : `${below}/${entry.name}`;
    if (entry.isDirectory()) return MADE.test(name) ? [] : files(name);
    return MADE_FILES.test(name) ? [] : [name];
  });
}

/** The files that people write in words or code. */
export const textFiles = (): string[] => files().filter((file) => TEXT.test(file));

export const read = (file: string): string => readFileSync(path.join(root, file), "utf8");

/** What stands directly at the top of the repository. */
export const top = (): string[] => [...new Set(files().map((file) => file.split("/")[0] ?? file))].toSorted();

/** The files whose content matches, for a message that names them. */
export const matching = (among: readonly string[], pattern: RegExp): string[] =>
  among.filter((file) => pattern.test(read(file)));
