import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import ts from 'typescript';

const ROOT = resolve(import.meta.dirname, '../..');

/** Who may import whom; a room not listed beside another is out of its reach. */
const MAY: Readonly<Record<string, readonly string[]>> = {
  'domain/units': [],
  'domain/records': [],
  'domain/numerics': ['domain/units'],
  'domain/materials': ['domain/units', 'domain/assessment-types'],
  'domain/geometry': ['domain/units'],
  'domain/fracture': ['domain/units', 'domain/numerics', 'domain/materials', 'domain/geometry'],
  'domain/growth': ['domain/units', 'domain/numerics', 'domain/materials', 'domain/geometry'],
  'domain/probability': ['domain/units', 'domain/numerics', 'domain/materials', 'domain/geometry'],
  'domain/assessment': [
    'domain/assessment-types',
    'domain/units',
    'domain/numerics',
    'domain/materials',
    'domain/geometry',
    'domain/fracture',
    'domain/growth',
    'domain/probability',
  ],
  'domain/assessment-types': ['domain/units', 'domain/geometry'],
  'domain/scheduling': ['domain/units', 'domain/geometry', 'domain/assessment-types'],
  'domain/inspection': ['domain/units', 'domain/geometry', 'domain/contract'],
  'domain/contract': ['domain/units', 'domain/geometry', 'domain/assessment-types'],
  'domain/schema': ['domain/contract', 'domain/units', 'domain/assessment-types'],
};

const EVERY_DOMAIN_ROOM = [...Object.keys(MAY), 'domain/verification'];
const BROWSER_ROOMS = EVERY_DOMAIN_ROOM.filter((room) => room !== 'domain/schema');

const REST: Readonly<Record<string, readonly string[]>> = {
  'domain/verification': EVERY_DOMAIN_ROOM.filter((room) => !/schema|contract/.test(room)),
  'api/http': ['domain/contract', 'api/db', 'api/root'],
  'api/db': ['domain/schema', 'domain/contract', 'db'],
  'api/mail': ['domain/contract', 'domain/schema', 'api/db', 'api/root', 'api/http'],
  'api/modules': [...EVERY_DOMAIN_ROOM, 'api/http', 'api/db', 'api/mail', 'api/root'],
  'api/jobs': ['api/modules', 'api/mail', 'api/db', 'api/http', 'api/root', ...EVERY_DOMAIN_ROOM],
  'api/root': [
    'api/http',
    'api/db',
    'api/mail',
    'api/modules',
    'api/jobs',
    'seeds',
    'domain/schema',
    'domain/contract',
  ],
  'client/shared': [...BROWSER_ROOMS],
  'client/core': ['client/shared', 'domain/contract', 'domain/units'],
  'client/features': ['client/core', 'client/shared', ...BROWSER_ROOMS],
  'client/root': ['client/core', 'client/shared', 'client/features', 'domain/contract'],
  seeds: [...EVERY_DOMAIN_ROOM, 'api/modules', 'api/db', 'api/http', 'api/root', 'api/mail'],
  db: ['domain/schema', 'domain/contract', 'api/db', 'api/root'],
};

const files = ['libs', 'apps', 'seeds', 'db'].flatMap((folder) => sourcesIn(join(ROOT, folder)));

describe('the walls between rooms', () => {
  it('lets no file import from a room it may not know', () => {
    const strays = imports()
      .filter(({ from, to }) => from !== to && !({ ...MAY, ...REST }[from] ?? []).includes(to))
      .map(({ file, target, from, to }) => `${file} (${from}) → ${target} (${to})`);
    expect(strays).toEqual([]);
  });

  it('lets no feature import another feature', () => {
    const feature = (path: string) => /features\/([^/]+)\//.exec(path)?.[1];
    const strays = imports()
      .filter(({ file, target }) => {
        const other = feature(target);
        return feature(file) !== undefined && other !== undefined && feature(file) !== other;
      })
      .map(({ file, target }) => `${file} → ${target}`);
    expect(strays).toEqual([]);
  });

  it('lets no module reach into another module’s repository', () => {
    const module = (path: string) => /api\/src\/modules\/([^/]+)\//.exec(path)?.[1];
    const strays = imports()
      .filter(
        // the type of a record may be known elsewhere, the way to read and write it may not
        ({ file, target, typeOnly }) =>
          !typeOnly && /\.repository(\.ts)?$/.test(target) && module(file) !== module(target),
      )
      .map(({ file, target }) => `${file} → ${target}`);
    expect(strays).toEqual([]);
  });

  it('has no circle of imports', () => {
    const edges = new Map<string, string[]>();
    for (const { file, target, typeOnly } of imports()) {
      if (!typeOnly) edges.set(file, [...(edges.get(file) ?? []), target]);
    }
    expect(circles(edges)).toEqual([]);
  });

  it('keeps the database, the server and the schema out of the browser’s rooms', () => {
    const banned = /^(drizzle-orm|@electric-sql|express|lucia|pg|multer|nodemailer|node:)/;
    const strays = files
      .filter((file) => /apps\/client\/src|libs\/domain\/src\/(?!schema)/.test(file))
      .flatMap((file) =>
        packagesOf(file)
          .filter((name) => banned.test(name))
          .map((name) => `${file} → ${name}`),
      );
    expect(strays).toEqual([]);
  });
});

function sourcesIn(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return sourcesIn(path);
    return /\.ts$/.test(path) && !/\.spec\.ts$/.test(path) ? [relative(ROOT, path)] : [];
  });
}

interface Import {
  readonly file: string;
  readonly target: string;
  readonly from: string;
  readonly to: string;
  readonly typeOnly: boolean;
}

function imports(): Import[] {
  return files.flatMap((file) =>
    specifiersOf(file).flatMap(({ name, typeOnly }) => {
      const target = resolveLocal(file, name);
      return target ? [{ file, target, from: roomOf(file), to: roomOf(target), typeOnly }] : [];
    }),
  );
}

function specifiersOf(file: string): { name: string; typeOnly: boolean }[] {
  const source = ts.createSourceFile(
    file,
    readFileSync(join(ROOT, file), 'utf8'),
    ts.ScriptTarget.ES2022,
  );
  const found: { name: string; typeOnly: boolean }[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
      found.push({ name: node.moduleSpecifier.text, typeOnly: isTypeOnly(node.importClause) });
    } else if (
      ts.isExportDeclaration(node) &&
      node.moduleSpecifier &&
      ts.isStringLiteral(node.moduleSpecifier)
    ) {
      found.push({ name: node.moduleSpecifier.text, typeOnly: node.isTypeOnly });
    } else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      const [argument] = node.arguments;
      // a lazy import breaks a circle
      if (argument && ts.isStringLiteral(argument))
        found.push({ name: argument.text, typeOnly: true });
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
  if (!clause) return false;
  if (clause.isTypeOnly) return true;
  const names = clause.namedBindings;
  return (
    !clause.name &&
    !!names &&
    ts.isNamedImports(names) &&
    names.elements.every((each) => each.isTypeOnly)
  );
}

const packagesOf = (file: string) =>
  specifiersOf(file)
    .map(({ name }) => name)
    .filter((name) => !name.startsWith('.') && !name.startsWith('@ligament/'));

function resolveLocal(file: string, name: string): string | undefined {
  const path = name.startsWith('@ligament/domain/')
    ? join('libs/domain/src', name.slice('@ligament/domain/'.length))
    : name.startsWith('.')
      ? join(dirname(file), name)
      : undefined;
  return path && (/\.(ts|mjs|json|css|scss)$/.test(path) ? path : `${path}.ts`);
}

function roomOf(path: string): string {
  if (/libs\/domain\/src\/assessment\/assessment-(input|outcome)/.test(path))
    return 'domain/assessment-types';
  const domain = /libs\/domain\/src\/([^/]+)\//.exec(path)?.[1];
  if (domain) return `domain/${domain}`;
  const api = /apps\/api\/src\/(http|db|mail|modules|jobs)\//.exec(path)?.[1];
  if (api) return `api/${api}`;
  if (path.startsWith('apps/api/')) return 'api/root';
  const client = /apps\/client\/src\/app\/(shared|core|features)\//.exec(path)?.[1];
  if (client) return `client/${client}`;
  if (path.startsWith('apps/client/')) return 'client/root';
  return path.split('/')[0] ?? path;
}

function circles(edges: ReadonlyMap<string, readonly string[]>): string[] {
  const state = new Map<string, 'open' | 'done'>();
  const found: string[] = [];
  const walk = (file: string, trail: readonly string[]): void => {
    if (state.get(file) === 'done') return;
    if (state.get(file) === 'open') {
      found.push([...trail.slice(trail.indexOf(file)), file].join(' → '));
      return;
    }
    state.set(file, 'open');
    for (const next of edges.get(file) ?? []) walk(next, [...trail, file]);
    state.set(file, 'done');
  };
  for (const file of edges.keys()) walk(file, []);
  return found;
}
