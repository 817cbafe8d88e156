import type { NestExpressApplication } from '@nestjs/platform-express';
import { getModelToken } from '@nestjs/sequelize';
import { hashSync } from 'bcryptjs';
import { buildRun } from '@fairlead/shared';
import type { CreateJobBody, Job, Role, Run, RunDocument } from '@fairlead/shared';
import { AccessTokensService } from '../src/auth/access-tokens.service';
import { SessionsService } from '../src/auth/sessions.service';
import { newId } from '../src/common/new-id';
import type { Viewer } from '../src/common/viewer';
import { JobsService } from '../src/jobs/jobs.service';
import { Company } from '../src/people/models/company.model';
import { PeopleService } from '../src/people/people.service';
import { RunsService } from '../src/runs/runs.service';

export const PASSWORD = 'correct horse battery';
/** The cheapest bcrypt allows: a test that does not measure hashing should not pay for it. */
const CHEAP_HASH = hashSync(PASSWORD, 4);

/** A person who is signed in. */
export interface TestPerson extends Viewer {
  token: string;
  refreshToken: string;
}

let counter = 0;
/** Differs on each call, in every worker and in every run on a kept database. */
function unique(word: string): string {
  counter += 1;
  return `${word}-${newId().slice(9, 18)}${newId().slice(-6)}-${counter}`;
}

/** Each builder makes the parents it is not given. */
export function factories(app: NestExpressApplication) {
  const people = app.get(PeopleService);
  const sessions = app.get(SessionsService);
  const tokens = app.get(AccessTokensService);
  const jobs = app.get(JobsService);
  const runs = app.get(RunsService);
  const companies = app.get<typeof Company>(getModelToken(Company));

  async function buildCompany(overrides: Partial<{ name: string }> = {}): Promise<string> {
    const id = newId();
    const name = overrides.name ?? unique('Shop');
    await companies.create({ id, name, timeZone: 'UTC', createdAt: new Date() });
    return id;
  }

  async function buildPerson(
    overrides: Partial<{ role: Role; companyId: string; name: string; email: string }> = {},
  ): Promise<TestPerson> {
    const companyId = overrides.companyId ?? (await buildCompany());
    const membership = await people.addPerson(companyId, overrides.role ?? 'owner', {
      name: overrides.name ?? unique('Person'),
      email: overrides.email ?? `${unique('person')}@shop.test`,
      passwordHash: CHEAP_HASH,
    });
    if (!membership) throw new Error('the e-mail is taken');
    return signInAs(companyId, membership.userId);
  }

  /** One more session of a person. */
  async function signInAs(companyId: string, userId: string): Promise<TestPerson> {
    const { session, refreshToken } = await sessions.open(companyId, userId);
    const viewer = await people.findViewer({ userId, companyId, sessionId: session.id });
    if (!viewer) throw new Error('nobody with this session');
    return { ...viewer, token: await tokens.sign(session), refreshToken };
  }

  async function buildJob(
    overrides: Partial<CreateJobBody> & { by?: TestPerson; people?: TestPerson[] } = {},
  ): Promise<Job & { by: TestPerson }> {
    const { by = await buildPerson(), people: assigned = [], ...body } = overrides;
    const number = unique('J');
    let job = await jobs.create(by, { id: newId(), number, name: 'Roof units', ...body });
    for (const person of assigned) job = await jobs.assign(by, job.id, person.userId);
    return { ...job, by };
  }

  async function buildStoredRun(
    overrides: Partial<{
      by: TestPerson;
      jobId: string;
      id: string;
      document: RunDocument;
      area: string;
      system: string;
    }> = {},
  ): Promise<Run & { by: TestPerson }> {
    const by = overrides.by ?? (await buildPerson());
    const jobId = overrides.jobId ?? (await buildJob({ by })).id;
    const run = await runs.create(by, jobId, {
      id: overrides.id ?? newId(),
      document: overrides.document ?? buildRun({ tag: unique('F') }),
      area: overrides.area,
      system: overrides.system,
    });
    return { ...run, by };
  }

  return { buildCompany, buildPerson, signInAs, buildJob, buildStoredRun };
}

export type Factories = ReturnType<typeof factories>;
