import { Controller, Get, Module } from '@nestjs/common';
import { DiscoveryModule, DiscoveryService, MetadataScanner, NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { ROLES, buildRun } from '@fairlead/shared';
import type { Role } from '@fairlead/shared';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { AccessCheck } from '../src/common/access/access-check';
import { listRoutes } from '../src/common/access/route-list';
import type { RouteEntry } from '../src/common/access/route-list';
import { newId } from '../src/common/new-id';
import { api, missingId } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';
import type { Factories, TestPerson } from './factories';

let app: NestExpressApplication;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  make = factories(app);
});
afterAll(() => app.close());

const OFFICE: readonly Role[] = ['owner', 'estimator', 'foreman'];

/** Who may call what, said once more and independently of the server's own tables. */
const EXPECTED: Record<string, 'public' | 'signed-in' | readonly Role[]> = {
  'GET /health': 'public',
  'POST /analyses': 'public',
  'POST /auth/sign-up': 'public',
  'POST /auth/sign-in': 'public',
  'POST /auth/refresh': 'public',
  'POST /auth/sign-out': 'public',
  'GET /me': 'signed-in',
  'GET /company': ROLES,
  'PUT /company/settings': ['owner'],
  'GET /people': OFFICE,
  'GET /jobs': ROLES,
  'POST /jobs': OFFICE,
  'GET /jobs/:jobId': ROLES,
  'PATCH /jobs/:jobId': OFFICE,
  'DELETE /jobs/:jobId': OFFICE,
  'POST /jobs/:jobId/restore': OFFICE,
  'PUT /jobs/:jobId/people/:userId': OFFICE,
  'DELETE /jobs/:jobId/people/:userId': OFFICE,
  'GET /jobs/:jobId/runs': ROLES,
  'POST /jobs/:jobId/runs': ROLES,
  'GET /runs/:runId': ROLES,
  'PATCH /runs/:runId': ROLES,
  'PUT /runs/:runId/document': ROLES,
  'DELETE /runs/:runId': ROLES,
  'POST /runs/:runId/restore': ROLES,
};

/** A body each write would accept, so that only the id can be what is refused. */
const bodies: Record<string, () => object> = {
  'PATCH /jobs/:jobId': () => ({ baseVersion: 1, name: 'Taken over' }),
  'POST /jobs/:jobId/runs': () => ({ id: newId(), document: buildRun() }),
  'PATCH /runs/:runId': () => ({ area: 'Taken over' }),
  'PUT /runs/:runId/document': () => ({ baseVersion: 1, document: buildRun() }),
};

const routes = () => listRoutes(app.get(DiscoveryService), app.get(MetadataScanner));
const nameOf = ({ method, path }: RouteEntry) => `${method} ${path}`;

function send(route: RouteEntry, ids: Record<string, string>, person: { token?: string }) {
  const path = route.path.replace(/:(\w+)/g, (_match, name: string) => ids[name] ?? '?');
  const method = route.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  return api(app)(method, path, person, bodies[nameOf(route)]?.());
}

describe('every route of the running server', () => {
  it('carries an access decision and stands in the table above', () => {
    const found = routes();
    expect(found.filter(({ access }) => !access)).toEqual([]);
    expect(found.map(nameOf).sort()).toEqual(Object.keys(EXPECTED).sort());
  });

  it('lets in exactly the roles of the table', async () => {
    const companyId = await make.buildCompany();
    const people = new Map<Role, TestPerson>();
    for (const role of ROLES) people.set(role, await make.buildPerson({ role, companyId }));
    const ids = { jobId: missingId(), runId: missingId(), userId: missingId() };
    for (const route of routes()) {
      const expected = EXPECTED[nameOf(route)] ?? [];
      if (expected === 'public') continue;
      for (const token of [undefined, 'malformed', 'a.b.c']) {
        expect([nameOf(route), (await send(route, ids, { token })).status]).toEqual([
          nameOf(route),
          401,
        ]);
      }
      for (const [role, person] of people) {
        const { status } = await send(route, ids, person);
        const allowed = expected === 'signed-in' || expected.includes(role);
        expect([nameOf(route), role, status === 403]).toEqual([nameOf(route), role, !allowed]);
        expect(status).toBeLessThan(500);
      }
    }
  });

  it("answers another company's ids as it answers ids that nobody has", async () => {
    const theirs = await make.buildStoredRun();
    const helper = await make.buildPerson({ role: 'crew', companyId: theirs.by.companyId });
    const owner = await make.buildPerson();
    const own = await make.buildJob({ by: owner });
    const before = await rowsOf(theirs.by.companyId);
    const foreign = { jobId: theirs.jobId, runId: theirs.id, userId: helper.userId };
    const missing = { jobId: missingId(), runId: missingId(), userId: missingId() };
    const withIds = routes().filter(({ path }) => path.includes(':'));
    expect(withIds.length).toBeGreaterThanOrEqual(13);
    for (const route of withIds) {
      const pairs = [[foreign, missing]];
      // Somebody else's person in a job of one's own.
      if (route.path.includes(':userId')) {
        pairs.push([
          { ...foreign, jobId: own.id },
          { ...missing, jobId: own.id },
        ]);
      }
      for (const [one = missing, other = missing] of pairs) {
        const [a, b] = [await send(route, one, owner), await send(route, other, owner)];
        expect([nameOf(route), a.status]).toEqual([nameOf(route), 404]);
        expect({ ...a.body, requestId: '' }).toEqual({ ...b.body, requestId: '' });
        expect(a.status).toBe(b.status);
      }
    }
    expect(await rowsOf(theirs.by.companyId)).toEqual(before);
  });

  it.each([
    '1',
    '1 or 1=1',
    "'",
    '%00',
    '..%2f..',
    'x'.repeat(300),
    '[object Object]',
    '%F0%9F%92%A9',
  ])('answers "%.20s" in place of an id with 404', async (id) => {
    const owner = await make.buildPerson();
    for (const route of routes().filter(({ path }) => path.includes(':'))) {
      const { status } = await send(route, { jobId: id, runId: id, userId: id }, owner);
      expect([nameOf(route), status]).toEqual([nameOf(route), 404]);
    }
  });
});

/** What a company owns, as the database holds it. */
async function rowsOf(companyId: string): Promise<unknown[]> {
  const tables = ['jobs', 'job_people', 'runs', 'run_revisions', 'memberships'];
  const read = (table: string) =>
    app.get(Sequelize).query(`SELECT * FROM ${table} WHERE company_id = :companyId`, {
      replacements: { companyId },
      type: QueryTypes.SELECT,
    });
  return Promise.all(tables.map(read));
}

describe('a handler without a decision', () => {
  @Controller('forgotten')
  class ForgottenController {
    @Get()
    everything(): string {
      return 'open';
    }
  }

  @Module({
    imports: [DiscoveryModule],
    controllers: [ForgottenController],
    providers: [AccessCheck],
  })
  class ForgottenModule {}

  it('keeps the server from starting', async () => {
    const careless = await NestFactory.create(ForgottenModule, { logger: false });
    await expect(careless.init()).rejects.toThrow('ForgottenController.everything');
    await careless.close();
  });
});
