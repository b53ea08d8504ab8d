/** No regular expression of ours backtracks super-linearly: each literal is proved by a checker of regular expressions. */

import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { checkSync } from "recheck";
import ts from "typescript";
import { describe, expect, it } from "vitest";

const FOLDERS = ["shared-lib", "server", "client"];

interface Literal {
  readonly place: string;
  readonly source: string;
  readonly flags: string;
}

function literalsOf(file: string): readonly Literal[] {
  const tree = ts.createSourceFile(file, readFileSync(file, "utf8"), ts.ScriptTarget.Latest, true);
  const found: Literal[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isRegularExpressionLiteral(node)) {
      const end = node.text.lastIndexOf("/");
      const { line } = tree.getLineAndCharacterOfPosition(node.getStart());
      found.push({ place: `${file}:${line + 1}`, source: node.text.slice(1, end), flags: node.text.slice(end + 1) });
    }
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return found;
}

const literals = FOLDERS.flatMap((folder) =>
  readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((name) => name.endsWith(".ts") && !name.includes("generated"))
    .flatMap((name) => literalsOf(path.join(folder, name))),
);

describe("regular expressions", () => {
  it("are found, and the checker tells a bad one", () => {
    expect(literals.length).toBeGreaterThan(20);
    expect(checkSync("^(a+)+$", "").status).toBe("vulnerable");
  });

  it("are all linear", () => {
    const seen = new Map<string, string>();
    for (const { place, source, flags } of literals) seen.set(`${source}\n${flags}`, place);
    const bad = [...seen].flatMap(([key, place]) => {
      const [source = "", flags = ""] = key.split("\n");
      const result = checkSync(source, flags, { timeout: 20_000 });
      if (result.status === "safe") return [];
      return [
        `${place}: /${source}/${flags} ${result.status === "vulnerable" ? result.complexity.summary : result.status}`,
      ];
    });
    expect(bad).toEqual([]);
  }, 300_000);
});
