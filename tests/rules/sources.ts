import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

export const root = path.resolve(import.meta.dirname, '../..');

/** Paths of the project's own TypeScript below a folder, from the root, with forward slashes. */
export const filesBelow = (folder: string, ending = /\.tsx?$/): string[] =>
  readdirSync(path.join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && ending.test(entry.name))
    .map((entry) => path.relative(root, path.join(entry.parentPath, entry.name)).replaceAll(path.sep, '/'))
    .sort();

export const textOf = (file: string): string => readFileSync(path.join(root, file), 'utf8');

export const parsed = (file: string): ts.SourceFile =>
  ts.createSourceFile(file, textOf(file), ts.ScriptTarget.ES2023, true, file.endsWith('x') ? ts.ScriptKind.TSX : ts.ScriptKind.TS);

export interface Import {
  from: string;
  /** A path from the root for the project's own files, a package's name (with its subpath) otherwise. */
  to: string;
  /** Only types: gone when it runs. */
  typeOnly: boolean;
}

export function importsOf(file: string): Import[] {
  const found: Import[] = [];
  const visit = (node: ts.Node): void => {
    const to = targetOf(node);
    if (to !== undefined) found.push({ from: file, to: resolved(file, to), typeOnly: isTypeOnly(node) });
    ts.forEachChild(node, visit);
  };
  visit(parsed(file));
  return found;
}

function targetOf(node: ts.Node): string | undefined {
  if ((ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) && node.moduleSpecifier && ts.isStringLiteral(node.moduleSpecifier)) return node.moduleSpecifier.text;
  const [given] = ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword ? node.arguments : [];
  return given && ts.isStringLiteral(given) ? given.text : undefined;
}

function isTypeOnly(node: ts.Node): boolean {
  if (ts.isExportDeclaration(node)) return node.isTypeOnly;
  if (!ts.isImportDeclaration(node)) return false;
  const clause = node.importClause;
  if (!clause) return false;
  const named = clause.namedBindings;
  const everyType = named !== undefined && ts.isNamedImports(named) && named.elements.length > 0 && named.elements.every((one) => one.isTypeOnly);
  return clause.isTypeOnly || (everyType && !clause.name);
}

const known = new Set([...filesBelow('server'), ...filesBelow('src')]);

function resolved(file: string, to: string): string {
  if (!to.startsWith('.')) return to;
  const base = path.posix.join(path.posix.dirname(file), to);
  return [base, `${base}.ts`, `${base}.tsx`, `${base}/index.ts`, `${base}/index.tsx`].find((one) => known.has(one)) ?? base;
}
