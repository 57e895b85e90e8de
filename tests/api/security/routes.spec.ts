import { may, ROLES, type Role } from '@ligament/domain/contract/policy';
import type { RouteContract } from '@ligament/domain/contract/route';
import { tables } from '@ligament/domain/schema/tables';
import { getTableName, sql } from 'drizzle-orm';
import * as z from 'zod';
import { createApp } from '../../../apps/api/src/app';
import type { Database } from '../../../apps/api/src/db/database';
import { as, testPlant, type TestPerson, type TestPlant } from '../../support/test-plant';

/** Every route there is, and every one that will be: these sweeps read the list the server itself keeps. */
describe('every route', () => {
  let plant: TestPlant;
  let byRole: Record<Role, TestPerson>;

  beforeAll(async () => {
    plant = await testPlant();
    byRole = {
      inspector: plant.inspector,
      engineer: plant.engineer,
      planner: plant.planner,
      operations: plant.operations,
      auditor: plant.auditor,
      administrator: plant.administrator,
    };
  }, 60_000);
  afterAll(() => plant.close());

  const contracts = () => plant.api.contracts;
  const address = ({ path }: RouteContract, value = '00000000-0000-4000-8000-000000000000') =>
    path.replaceAll(/:\w+/g, value);
  const call = (contract: RouteContract, person: TestPerson | null, app = plant.app) => {
    const sent = as(app, person)[contract.method](address(contract));
    if (contract.versioned) void sent.set('If-Match', '"1"');
    return contract.method === 'get' || contract.method === 'delete' ? sent : sent.send({});
  };

  it('has an access rule, and only signing in, set-up, links by mail and the health check are public', () => {
    const open = contracts()
      .filter(({ access }) => access === 'public')
      .map(({ method, path }) => `${method} ${path}`);
    expect(open.sort()).toEqual([
      'get /api/health',
      'get /api/setup',
      'post /api/invitations/:token/accept',
      'post /api/password-resets',
      'post /api/password-resets/:token',
      'post /api/session',
      'post /api/setup',
    ]);
    for (const { access, path } of contracts())
      expect({ path, access }).toEqual({ path, access: expect.any(String) });
  });

  it('is served once', () => {
    const names = contracts().map(({ method, path }) => `${method} ${path}`);
    expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
  });

  it('answers 401 to whoever is not signed in', async () => {
    for (const contract of contracts()) {
      if (contract.access === 'public') continue;
      const { status } = await call(contract, null);
      expect({ path: contract.path, status }).toEqual({ path: contract.path, status: 401 });
    }
  });

  it.each(ROLES)(
    'refuses a %s exactly where the policy does',
    async (role) => {
      for (const contract of contracts()) {
        if (contract.access === 'public') continue;
        // signing out ends the session the next request needs
        const person = contract.path === '/api/session' ? await plant.person(role) : byRole[role];
        const { status, body } = await call(contract, person);
        const refused = status === 403 && String(body.detail).startsWith('Your role');
        expect({
          route: `${contract.method} ${contract.path}`,
          refused,
          in: status !== 401,
        }).toEqual({
          route: `${contract.method} ${contract.path}`,
          refused: !may(role, contract.access),
          in: true,
        });
      }
    },
    60_000,
  );

  it('that signs something off asks for the password again after five minutes', async () => {
    const start = plant.clock.now();
    for (const contract of contracts().filter(({ proof }) => proof)) {
      const role = ROLES.find((each) => contract.access !== 'public' && may(each, contract.access));
      if (!role) throw new Error(`nobody may call ${contract.path}`);
      const person = await plant.person(role);
      const codeAt = async (milliseconds: number) => {
        plant.clock.set(new Date(start.getTime() + milliseconds));
        const { body } = await call(contract, person);
        return String((body as { type?: unknown }).type ?? '');
      };
      expect(await codeAt(5 * 60_000)).not.toContain('proof-required');
      expect(await codeAt(5 * 60_000 + 1)).toContain('proof-required');
      plant.clock.set(start);
    }
  });

  it('carries the headers that keep a browser safe, in success and in failure', async () => {
    const answers = [
      await as(plant.app, null).get('/api/nowhere'),
      await as(plant.app, null).put('/api/session').send({}),
      ...(await Promise.all(
        contracts()
          .filter(({ method }) => method === 'get')
          .map((contract) => call(contract, plant.auditor)),
      )),
    ];
    for (const { headers } of answers) {
      expect(headers).toMatchObject({
        'x-content-type-options': 'nosniff',
        'referrer-policy': 'no-referrer',
        'cross-origin-opener-policy': 'same-origin',
        'cache-control': 'no-store',
        'content-security-policy': expect.stringContaining("frame-ancestors 'none'"),
        'x-request-id': expect.stringMatching(/^[0-9a-f-]{36}$/),
      });
      expect(headers['x-powered-by']).toBeUndefined();
      if (/json|text/.test(String(headers['content-type']))) {
        expect(headers['content-type']).toContain('charset=utf-8');
      }
    }
    const { config } = plant.deps;
    const tls = createApp(
      { ...plant.deps, config: { ...config, publicUrl: 'https://ligament.example.org' } },
      'dist/client',
    ).app;
    const { headers } = await as(tls, null).get('/api/health');
    expect(headers['strict-transport-security']).toMatch(/max-age=(3153600\d|[4-9]\d{7})/);
  });

  it('changes nothing when it is only read', async () => {
    const before = await fingerprints(plant.db);
    for (const contract of contracts()) {
      if (contract.method !== 'get') continue;
      for (const person of [plant.administrator, plant.engineer, plant.planner]) {
        await call(contract, person);
        await as(plant.app, person).get(address(contract, plant.planner.id));
      }
    }
    expect(await fingerprints(plant.db)).toEqual(before);
  }, 60_000);

  it('takes no field it does not name, at any depth', () => {
    for (const { method, path, body, upload } of contracts()) {
      if (upload || method === 'get') continue;
      const loose = looseObjects(z.toJSONSchema(body, { io: 'input', unrepresentable: 'any' }));
      expect({ path, loose }).toEqual({ path, loose: [] });
    }
  });

  it('lets nobody set what the server alone decides', () => {
    const decidedHere = [
      'siteId',
      'version',
      'createdAt',
      'updatedAt',
      'createdBy',
      'approvedBy',
      'approvedAt',
      'passwordHash',
      'hash',
      'previousHash',
      'actorId',
      'failedSignIns',
      'lockedUntil',
    ];
    for (const { method, path, body, upload } of contracts()) {
      if (upload || method === 'get') continue;
      for (const name of decidedHere) {
        const read = body.safeParse({ [name]: 'x' });
        const named = read.error?.issues.some((issue) => issue.path[0] === name) ?? true;
        expect({ path, name, named: read.success || named }).toEqual({ path, name, named: false });
      }
    }
  });

  it('fails closed and blandly when anything inside throws', async () => {
    const broken = new Proxy({} as Database, {
      get: () => {
        throw new Error('select secret from /srv/private at line 12');
      },
    });
    let armed = false;
    const db = new Proxy(plant.db, {
      get: (target, name) => Reflect.get(armed ? broken : target, name) as unknown,
    });
    const { app } = createApp({ ...plant.deps, db }, 'dist/client');
    armed = true;
    for (const contract of contracts()) {
      const { status, text, body } = await call(contract, plant.engineer, app);
      expect(text).not.toMatch(/secret|srv|select|\.ts|at line/);
      expect({ path: contract.path, failed: status >= 400 }).toEqual({
        path: contract.path,
        failed: true,
      });
      if (status === 500) expect(body.instance).toMatch(/^urn:ligament:request:[0-9a-f-]{36}$/);
    }
  });
});

/** A hash of every table's rows, to see whether anything at all changed. */
async function fingerprints(db: Database): Promise<Record<string, string>> {
  const found: Record<string, string> = {};
  for (const table of Object.values(tables)) {
    const name = getTableName(table);
    const answer = await db.execute(
      sql`select coalesce(md5(string_agg(t::text, '|' order by t::text)), '') as hash from ${sql.identifier(name)} t`,
    );
    const [row] = (answer as unknown as { rows: { hash: string }[] }).rows;
    found[name] = row?.hash ?? '';
  }
  return found;
}

/** Paths of objects in a JSON schema that would take members they do not name. */
function looseObjects(schema: unknown, path = ''): string[] {
  if (typeof schema !== 'object' || schema === null) return [];
  if (Array.isArray(schema))
    return schema.flatMap((each, index) => looseObjects(each, `${path}/${index}`));
  const { properties, additionalProperties } = schema as {
    properties?: object;
    additionalProperties?: unknown;
  };
  const here = properties !== undefined && additionalProperties !== false ? [path || '/'] : [];
  return [
    ...here,
    ...Object.entries(schema).flatMap(([name, member]) => looseObjects(member, `${path}/${name}`)),
  ];
}
