import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import ts from 'typescript';
import { crackOf, influenceOf } from '@ligament/domain/verification/crack-of';
import * as quantity from '@ligament/domain/units/quantity';
import * as curvatureTables from '@ligament/domain/fracture/stress-intensity/curvature-table';

const DOMAIN = resolve(import.meta.dirname, '../../libs/domain/src');

/** Rooms and files whose exported functions are formulas: their comment is a data sheet. */
const FORMULA_FILES = ['fracture', 'geometry', 'growth', 'materials', 'numerics', 'probability']
  .flatMap((room) => sourcesIn(join(DOMAIN, room)))
  .filter((file) => /@source/.test(readFileSync(file, 'utf8')));

interface Sheet {
  readonly file: string;
  readonly name: string;
  readonly gaps: readonly string[];
  readonly example: string | null;
}

const sheets = FORMULA_FILES.flatMap(sheetsOf);

describe('the data sheets of the formulas', () => {
  it('are found', () => {
    expect(sheets.length).toBeGreaterThan(25);
  });

  it('give units, validity, source and a worked example for every formula', () => {
    expect(sheets.flatMap(({ gaps }) => gaps)).toEqual([]);
  });

  it.each(sheets.map((sheet) => [sheet.name, sheet] as const))(
    '%s: its worked example is true',
    async (_, { file, example }) => {
      const [expression = '', expected = ''] = (example ?? '')
        .split('//')
        .map((part) => part.trim());
      const module = (await import(pathToFileURL(file).href)) as Record<string, unknown>;
      const value = run(expression, { ...helpers, ...module });
      expect(value).toBeCloseTo(Number(expected), digitsOf(expected));
    },
  );
});

/** What an example may use besides the file's own exports. */
const helpers: Readonly<Record<string, unknown>> = {
  ...quantity,
  ...curvatureTables,
  crackOf,
  at: (
    influence: Parameters<typeof influenceOf>[0]['influence'],
    symbols: Parameters<typeof influenceOf>[1],
    angle: number,
    ...more: unknown[]
  ) =>
    influenceOf(
      {
        influence: (crack, phi, into) =>
          (influence as (...all: unknown[]) => void)(crack, phi, into, ...more),
      },
      symbols,
      angle,
    ),
};

function run(expression: string, scope: Readonly<Record<string, unknown>>): number {
  const names = Object.keys(scope);
  const body = new Function(...names, `return ${expression};`) as (...values: unknown[]) => unknown;
  return Number(body(...names.map((name) => scope[name])));
}

// as exact as the example is printed
function digitsOf(text: string): number {
  const [mantissa = '', exponent = '0'] = text.toLowerCase().split('e');
  return (mantissa.split('.')[1]?.length ?? 0) - Number(exponent);
}

function sourcesIn(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return sourcesIn(path);
    return /\.ts$/.test(path) && !/\.spec\.ts$/.test(path) ? [path] : [];
  });
}

function sheetsOf(file: string): Sheet[] {
  const source = ts.createSourceFile(
    file,
    readFileSync(file, 'utf8'),
    ts.ScriptTarget.ES2022,
    true,
  );
  return source.statements.flatMap((statement) => {
    const named = exportedFunction(statement);
    // a name given to an existing formula keeps that formula's parameters
    return named ? [sheetOf(file, named.name, named.node, named.parameters)] : [];
  });
}

interface Named {
  readonly name: string;
  readonly node: ts.Node;
  readonly parameters: readonly ts.ParameterDeclaration[];
}

/** An exported function, or a constant that names one; other constants are data, not formulas. */
function exportedFunction(statement: ts.Statement): Named | null {
  const modifiers = ts.canHaveModifiers(statement) ? ts.getModifiers(statement) : undefined;
  if (!modifiers?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword)) return null;
  if (ts.isFunctionDeclaration(statement) && statement.name) {
    return { name: statement.name.text, node: statement, parameters: [...statement.parameters] };
  }
  if (!ts.isVariableStatement(statement)) return null;
  const [declaration] = statement.declarationList.declarations;
  const { name, initializer } = declaration ?? {};
  if (!name || !initializer || !ts.isIdentifier(name)) return null;
  if (ts.isArrowFunction(initializer)) {
    return { name: name.text, node: statement, parameters: [...initializer.parameters] };
  }
  const renamed = ts.isIdentifier(initializer) && ts.getJSDocTags(statement).length > 0;
  return renamed ? { name: name.text, node: statement, parameters: [] } : null;
}

function sheetOf(
  file: string,
  name: string,
  node: ts.Node,
  parameters: readonly ts.ParameterDeclaration[],
): Sheet {
  const where = `${relative(DOMAIN, file)}: ${name}`;
  const tags = ts.getJSDocTags(node);
  const text = (tag: string) => {
    const found = tags.find(({ tagName }) => tagName.text === tag);
    return found ? (ts.getTextOfJSDocComment(found.comment) ?? '') : null;
  };
  const units = new Map(
    tags
      .filter(ts.isJSDocParameterTag)
      .map((tag) => [tag.name.getText(), ts.getTextOfJSDocComment(tag.comment) ?? '']),
  );
  const gaps = [
    ...parameters
      .map((parameter, i) =>
        ts.isIdentifier(parameter.name) ? parameter.name.text : ([...units.keys()][i] ?? 'first'),
      )
      .filter((parameter) => !/\[[^\]]+\]/.test(units.get(parameter) ?? ''))
      .map((parameter) => `${where}: ${parameter} has no unit`),
    ...['returns', 'validity', 'source', 'example']
      .filter((tag) => !text(tag))
      .map((tag) => `${where}: no @${tag}`),
    ...(/\[[^\]]+\]/.test(text('returns') ?? '[]x') || text('returns') === null
      ? []
      : [`${where}: @returns has no unit`]),
  ];
  return { file, name, gaps, example: text('example') };
}
