import { Injectable } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { DEMO_COMPANY, DEMO_PASSWORD, DEMO_PEOPLE } from '@fairlead/shared';
import type { DemoPerson, Role } from '@fairlead/shared';
import { PasswordsService } from '../auth/passwords.service';
import { newId } from '../common/new-id';
import type { Viewer } from '../common/viewer';
import { Transactions } from '../database/transactions';
import { JobsService } from '../jobs/jobs.service';
import { PeopleService } from '../people/people.service';
import { RunsService } from '../runs/runs.service';
import { DEMO_JOBS } from './demo-jobs';
import type { DemoJob } from './demo-jobs';

const DAY = 24 * 60 * 60 * 1000;

export type SeedOutcome = 'seeded' | 'present' | 'not-empty';

/** Fills an empty database with the made-up shop, through the services that people use; all of it or nothing. */
@Injectable()
export class DemoSeeder {
  constructor(
    private readonly sequelize: Sequelize,
    private readonly transactions: Transactions,
    private readonly passwords: PasswordsService,
    private readonly people: PeopleService,
    private readonly jobs: JobsService,
    private readonly runs: RunsService,
  ) {}

  /** `present`: an earlier start seeded it; `not-empty`: other people's data, left alone. */
  async seed(now: Date): Promise<SeedOutcome> {
    const passwordHash = await this.passwords.hash(DEMO_PASSWORD);
    return this.transactions.run(async () => {
      if (await this.isPresent()) return 'present';
      if (!(await this.isEmpty())) return 'not-empty';
      const viewers = await this.addPeople(passwordHash);
      for (const job of DEMO_JOBS) await this.addJob(job, viewers, now);
      return 'seeded';
    });
  }

  private async isPresent(): Promise<boolean> {
    const [owner] = DEMO_PEOPLE;
    return owner !== undefined && (await this.people.findAccount(owner.email)) !== undefined;
  }

  private async isEmpty(): Promise<boolean> {
    const rows = await this.sequelize.query('SELECT id FROM companies LIMIT 1', {
      type: QueryTypes.SELECT,
    });
    return rows.length === 0;
  }

  private async addPeople(passwordHash: string): Promise<Map<Role, Viewer>> {
    const [owner, ...others] = DEMO_PEOPLE;
    const viewers = new Map<Role, Viewer>();
    if (!owner) return viewers;
    const { name: companyName, timeZone } = DEMO_COMPANY;
    const ownership = await this.people.createCompanyWithOwner({
      ...owner,
      companyName,
      timeZone,
      passwordHash,
    });
    if (!ownership) return viewers;
    const { companyId } = ownership;
    viewers.set('owner', viewerOf(owner, companyId, ownership.userId));
    for (const person of others) {
      const { role } = person;
      const membership = await this.people.addPerson(companyId, role, { ...person, passwordHash });
      if (membership) viewers.set(role, viewerOf(person, companyId, membership.userId));
    }
    return viewers;
  }

  private async addJob(demo: DemoJob, viewers: Map<Role, Viewer>, now: Date): Promise<void> {
    const owner = viewers.get('owner');
    const foreman = viewers.get('foreman');
    if (!owner || !foreman) return;
    const { number, name, address, status, dueInDays } = demo;
    const dueDate = dueInDays === null ? null : dayAfter(now, dueInDays);
    const id = newId();
    await this.jobs.create(owner, { id, number, name, address, status, dueDate });
    for (const role of demo.people) {
      const person = viewers.get(role);
      if (person) await this.jobs.assign(owner, id, person.userId);
    }
    for (const run of demo.runs) await this.runs.create(foreman, id, { id: newId(), ...run });
  }
}

function viewerOf(person: DemoPerson, companyId: string, userId: string): Viewer {
  const { name, email, role } = person;
  const { name: companyName, timeZone } = DEMO_COMPANY;
  return { userId, name, email, role, companyId, companyName, timeZone, sessionId: newId() };
}

function dayAfter(now: Date, days: number): string {
  return new Date(now.getTime() + days * DAY).toISOString().slice(0, 10);
}
