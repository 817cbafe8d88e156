import type { NestExpressApplication } from '@nestjs/platform-express';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { newId } from '../src/common/new-id';
import { Transactions } from '../src/database/transactions';
import { createTestApp } from './create-test-app';
import { factories } from './factories';

let app: NestExpressApplication;
let transactions: Transactions;

beforeAll(async () => {
  app = await createTestApp();
  transactions = app.get(Transactions);
});
afterAll(() => app.close());

const update = (sql: string, replacements: object = {}) =>
  app.get(Sequelize).query(sql, { replacements: { ...replacements }, type: QueryTypes.UPDATE });

async function nameOf(id: string): Promise<string | undefined> {
  const [row] = await app
    .get(Sequelize)
    .query<{ name: string }>('SELECT name FROM companies WHERE id = :id', {
      replacements: { id },
      type: QueryTypes.SELECT,
    });
  return row?.name;
}

const rename = (id: string, name: string) =>
  update('UPDATE companies SET name = :name WHERE id = :id', { id, name });

it('every query inside finds the transaction by itself, and all of it goes back', async () => {
  const id = await factories(app).buildCompany({ name: 'before' });
  const work = transactions.run(async () => {
    await rename(id, 'inside');
    await transactions.run(() => rename(id, 'deeper'));
    expect(await nameOf(id)).toBe('deeper');
    throw new Error('changed our mind');
  });
  await expect(work).rejects.toThrow('changed our mind');
  expect(await nameOf(id)).toBe('before');
});

it('twice as many as there are connections all get through', async () => {
  const id = await factories(app).buildCompany();
  const runs = Array.from({ length: 20 }, (_, index) =>
    transactions.run(async () => {
      await nameOf(id);
      await rename(id, `number ${index}`);
      return nameOf(id);
    }),
  );
  expect(await Promise.all(runs)).toHaveLength(20);
});

it('two that deadlock both succeed, the victim by running again', async () => {
  const make = factories(app);
  let attempts = 0;
  for (let round = 0; round < 10; round += 1) {
    const [one, two] = [await make.buildCompany(), await make.buildCompany()];
    // Each takes its first row, waits until the other has its own, then wants the other's.
    let first = 0;
    let release = () => {};
    const bothHold = new Promise<void>((resolve) => (release = resolve));
    const cross = (a: string, b: string) =>
      transactions.run(async () => {
        attempts += 1;
        await rename(a, `crossed ${round}`);
        first += 1;
        if (first === 2) release();
        await bothHold;
        await rename(b, `crossed ${round}`);
      });
    await Promise.all([cross(one, two), cross(two, one)]);
    expect([await nameOf(one), await nameOf(two)]).toEqual([
      `crossed ${round}`,
      `crossed ${round}`,
    ]);
  }
  expect(attempts).toBeGreaterThan(20);
});

it('gives up on what is no conflict at once', async () => {
  let attempts = 0;
  const work = transactions.run(async () => {
    attempts += 1;
    await update('UPDATE no_such_table SET id = 1');
  });
  await expect(work).rejects.toThrow();
  expect(attempts).toBe(1);
});

it('a connection of the pool is strict, in UTC and impatient', async () => {
  const [settings] = await app.get(Sequelize).query<Record<string, unknown>>(
    `SELECT @@sql_mode AS mode, @@time_zone AS zone, @@innodb_lock_wait_timeout AS wait,
            @@max_statement_time AS longest`,
    { type: QueryTypes.SELECT },
  );
  expect(settings).toMatchObject({ zone: '+00:00', wait: 5, longest: 10 });
  expect(settings?.mode).toContain('STRICT_ALL_TABLES');
});

it('the database itself refuses a job of one company with a person of another', async () => {
  const make = factories(app);
  const job = await make.buildJob();
  const stranger = await make.buildPerson();
  const insert = (companyId: string) =>
    update(
      `INSERT INTO job_people (company_id, job_id, user_id, assigned_at)
       VALUES (:companyId, :jobId, :userId, NOW(3))`,
      { companyId, jobId: job.id, userId: stranger.userId },
    );
  await expect(insert(job.by.companyId)).rejects.toMatchObject({ original: { errno: 1452 } });
  await expect(insert(stranger.companyId)).rejects.toMatchObject({ original: { errno: 1452 } });
  await expect(insert(newId())).rejects.toMatchObject({ original: { errno: 1452 } });
});
