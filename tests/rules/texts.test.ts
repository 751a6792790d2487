import { existsSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, test } from 'vitest';
import { filesBelow, parsed, root, textOf } from './sources';

/** Attributes whose words a person reads or hears. */
const SPOKEN = new Set(['title', 'alt', 'placeholder', 'label', 'aria-label', 'aria-description', 'aria-valuetext', 'aria-roledescription']);
/** The product's name is the same in every language. */
const hasWords = (text: string): boolean => /\p{L}{2,}/u.test(text.replace(/^\s*nilas\s*$/i, ''));

/** Words written into a page instead of taken from the locales. */
function hardCoded(source: ts.SourceFile): string[] {
  const found: string[] = [];
  const say = (node: ts.Node, text: string) => found.push(`${source.fileName}:${source.getLineAndCharacterOfPosition(node.getStart()).line + 1} ${text.trim()}`);
  const visit = (node: ts.Node): void => {
    if (ts.isJsxText(node) && hasWords(node.text)) say(node, node.text);
    if (ts.isJsxExpression(node) && node.expression && ts.isStringLiteral(node.expression) && ts.isJsxElement(node.parent) && hasWords(node.expression.text)) say(node, node.expression.text);
    if (ts.isJsxAttribute(node) && SPOKEN.has(node.name.getText()) && node.initializer) {
      const value = ts.isJsxExpression(node.initializer) ? node.initializer.expression : node.initializer;
      if (value && ts.isStringLiteral(value) && hasWords(value.text)) say(node, value.text);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

describe('pages', () => {
  const pages = filesBelow('src', /\.tsx$/);
  test('take every word from the locales', () => {
    expect(pages.length).toBeGreaterThan(50);
    expect(pages.flatMap((file) => hardCoded(parsed(file)))).toEqual([]);
  });

  test('and a word that is written in would be seen', () => {
    const page = (jsx: string) => hardCoded(ts.createSourceFile('p.tsx', `const p = ${jsx};`, ts.ScriptTarget.ES2023, true, ts.ScriptKind.TSX));
    expect(page('<p>Hello</p>')).toEqual(['p.tsx:1 Hello']);
    expect(page('<img alt="Freezer" />')).toEqual(['p.tsx:1 Freezer']);
    expect(page("<p>{'Hello'}</p>")).toEqual(['p.tsx:1 Hello']);
    expect(page('<p className="text-lg">{t("hello")} · 7</p>')).toEqual([]);
  });
});

describe.each(['README.md', 'DEVELOPERS.md'])('%s', (document) => {
  const named = [...textOf(document).matchAll(/`([^`\s]+)`/g)].map(([, name = '']) => name).filter((name) => /^(\.ci|drizzle|locales|server|src|tests)\//.test(name));

  test('names only paths there are', () => {
    const missing = named.filter((name) => !name.includes('<') && !spelledOut(name).every((one) => existsSync(path.join(root, one.replace(/\*.*$/, '')))));
    expect(missing).toEqual([]);
  });

  test('names some', () => {
    expect(named.length).toBeGreaterThan(0);
  });
});

/** `locales/{en,es}/x` is two paths. */
function spelledOut(name: string): string[] {
  const choice = /\{([^}]+)\}/.exec(name);
  return choice ? (choice[1] ?? '').split(',').flatMap((one) => spelledOut(name.replace(choice[0], one))) : [name];
}
