import type { NestExpressApplication } from '@nestjs/platform-express';
import { JOB_SORTS, RUN_SORTS, bend, buildRun, pullPoint, straight, wires } from '@fairlead/shared';
import type { JobStatus, Page, RunListItem } from '@fairlead/shared';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { newId } from '../src/common/new-id';
import { api } from './api';
import type { Api } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';
import type { Factories, TestPerson } from './factories';

let app: NestExpressApplication;
let call: Api;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  call = api(app);
  make = factories(app);
});
afterAll(() => app.close());

interface Row {
  id: string;
}

/** Reads a list to its end, `limit` rows at a time; `between` runs after each page. */
async function readAll(
  person: TestPerson,
  path: string,
  limit: number,
  between: (page: number) => Promise<unknown> = async () => undefined,
): Promise<string[]> {
  const ids: string[] = [];
  let cursor: string | null = '';
  for (let page = 0; cursor !== null; page += 1) {
    const after: string = cursor ? `&cursor=${encodeURIComponent(cursor)}` : '';
    const { status, body } = await call(
      'get',
      `${path}${path.includes('?') ? '&' : '?'}limit=${limit}${after}`,
      person,
    );
    expect(status).toBe(200);
    const answer = body as Page<Row>;
    ids.push(...answer.items.map(({ id }) => id));
    cursor = answer.nextCursor;
    if (page > 50) throw new Error('the list does not end');
    await between(page);
  }
  return ids;
}

const STATUSES: JobStatus[] = ['bidding', 'active', 'on-hold', 'done'];

async function buildJobs(count: number): Promise<TestPerson> {
  const by = await make.buildPerson();
  for (let index = 0; index < count; index += 1) {
    await make.buildJob({
      by,
      number: `J-${String(index).padStart(3, '0')}`,
      name: `Name ${index % 4}`,
      status: STATUSES[index % 4],
      // Every third one without, and several on one day: order must still be certain.
      dueDate: index % 3 ? `2027-01-0${1 + (index % 2)}` : null,
    });
  }
  return by;
}

describe('the list of jobs', () => {
  it.each(JOB_SORTS.flatMap((sort) => [sort, `-${sort}`]))(
    'by %s gives every row once, in pages of any size',
    async (sort) => {
      const by = await buildJobs(11);
      const whole = await readAll(by, `/jobs?sort=${sort}`, 100);
      expect(new Set(whole).size).toBe(11);
      expect(await readAll(by, `/jobs?sort=${sort}`, 3)).toEqual(whole);
      const turned = sort.startsWith('-') ? sort.slice(1) : `-${sort}`;
      expect(await readAll(by, `/jobs?sort=${turned}`, 4)).toEqual([...whole].reverse());
    },
  );

  it('orders by what it says: numbers, statuses in their own order, no due date last', async () => {
    const by = await buildJobs(8);
    const read = async (sort: string, field: string) => {
      const { body } = await call('get', `/jobs?sort=${sort}`, by);
      return (body as Page<Record<string, unknown>>).items.map((item) => item[field]);
    };
    const numbers = Array.from({ length: 8 }, (_, index) => `J-00${index}`);
    expect(await read('number', 'number')).toEqual(numbers);
    expect(await read('status', 'status')).toEqual(STATUSES.flatMap((status) => [status, status]));
    const dates = await read('dueDate', 'dueDate');
    expect(dates.slice(0, 5)).toEqual([...dates.slice(0, 5)].sort());
    expect(dates.slice(5)).toEqual([null, null, null]);
  });

  it('repeats and skips nothing while jobs are added and deleted between pages', async () => {
    const by = await buildJobs(12);
    const whole = await readAll(by, '/jobs?sort=number', 100);
    const seen = await readAll(by, '/jobs?sort=number', 3, async (page) => {
      await make.buildJob({ by, number: `A-${page}` });
      if (page === 0) await call('delete', `/jobs/${whole[1]}`, by);
    });
    expect(seen).toEqual(whole);
  });

  it('says how many there are in all, whatever the page', async () => {
    const by = await buildJobs(5);
    const { body } = await call('get', '/jobs?limit=2', by);
    expect(body).toMatchObject({ total: 5 });
    const filtered = await call('get', '/jobs?limit=1&status=bidding', by);
    expect(filtered.body).toMatchObject({ total: 2 });
    expect(filtered.body.items[0].status).toBe('bidding');
  });

  it('finds part of a number, a name or an address, in any case', async () => {
    const by = await make.buildPerson();
    const jobs = [
      await make.buildJob({ by, number: 'W-17', name: 'Warehouse' }),
      await make.buildJob({ by, number: 'X-1', name: 'Façade', address: '5 Ware Street' }),
      await make.buildJob({ by, number: 'X-2', name: '100% done_deal!' }),
    ];
    const find = async (search: string) => {
      const { body } = await call(
        'get',
        `/jobs?sort=number&search=${encodeURIComponent(search)}`,
        by,
      );
      return (body as Page<Row>).items.map(({ id }) => jobs.findIndex((job) => job.id === id));
    };
    expect(await find('ware')).toEqual([0, 1]);
    expect(await find('w-1')).toEqual([0]);
    expect(await find('facade')).toEqual([1]);
    // Wildcards stand for themselves.
    expect(await find('%')).toEqual([2]);
    expect(await find('0%')).toEqual([2]);
    expect(await find('e_d')).toEqual([2]);
    expect(await find('l!')).toEqual([2]);
    expect(await find("' OR '1'='1")).toEqual([]);
    expect(await find('\\')).toEqual([]);
  });
});

describe('the list of runs', () => {
  /** From nothing to too much, with some that tie. */
  const documents = [0, 1, 1, 2, 3, 4, 5].map((bends, index) =>
    buildRun({
      tag: `F-${index}`,
      title: index % 2 ? 'Feeder' : 'Branch',
      path: [
        pullPoint(),
        straight({ length: 120 + bends }),
        ...Array.from({ length: bends }, () => [bend(), straight()]).flat(),
        pullPoint(),
      ],
      ...(index > 2 && { conductors: [wires({ count: 2 * index })] }),
    }),
  );

  async function buildRuns() {
    const by = await make.buildPerson();
    const { id: jobId } = await make.buildJob({ by });
    for (const document of documents) await make.buildStoredRun({ by, jobId, document });
    return { by, path: `/jobs/${jobId}/runs` };
  }

  it.each(RUN_SORTS.flatMap((sort) => [sort, `-${sort}`]))(
    'by %s gives every row once, in pages of any size',
    async (sort) => {
      const { by, path } = await buildRuns();
      const whole = await readAll(by, `${path}?sort=${sort}`, 100);
      expect(new Set(whole).size).toBe(documents.length);
      expect(await readAll(by, `${path}?sort=${sort}`, 2)).toEqual(whole);
    },
  );

  it('orders by figures, and filters by status and words', async () => {
    const { by, path } = await buildRuns();
    const read = async (query: string) =>
      ((await call('get', `${path}?${query}`, by)).body as Page<RunListItem>).items;
    const degrees = (await read('sort=-degrees')).map(({ summary }) => summary.degrees);
    expect(degrees).toEqual([450, 360, 270, 180, 90, 90, 0]);
    const fills = (await read('sort=-fill')).map(({ summary }) => summary.fillPercent ?? -1);
    expect(fills).toEqual([...fills].sort((a, b) => b - a));
    expect(fills.filter((fill) => fill === -1)).toHaveLength(3);
    const over = await read('status=over');
    expect(over.map(({ tag }) => tag)).toEqual(['F-6']);
    expect((await read('search=feed&sort=tag')).map(({ tag }) => tag)).toEqual([
      'F-1',
      'F-3',
      'F-5',
    ]);
    expect((await read('search=f-4')).map(({ tag }) => tag)).toEqual(['F-4']);
  });

  it('forgets deleted runs until they are restored', async () => {
    const { by, path } = await buildRuns();
    const { body } = await call('get', path, by);
    const [first] = (body as Page<RunListItem>).items;
    await call('delete', `/runs/${first?.id}`, by);
    expect((await call('get', path, by)).body.total).toBe(documents.length - 1);
    await call('post', `/runs/${first?.id}/restore`, by);
    expect((await call('get', path, by)).body.total).toBe(documents.length);
  });
});

interface Plan {
  select_type: string;
  key: string;
  Extra: string;
}

describe('a page is cut from an index in its order, without sorting what is not shown', () => {
  const directions = (sorts: readonly string[]) => sorts.flatMap((sort) => [sort, `-${sort}`]);

  it.each([
    ...directions(JOB_SORTS).map((sort) => ['jobs', sort]),
    ...directions(RUN_SORTS).map((sort) => ['runs', sort]),
  ])('%s by %s', async (list, sort) => {
    const run = await make.buildStoredRun();
    await make.buildStoredRun({ by: run.by, jobId: run.jobId });
    const path = list === 'jobs' ? '/jobs' : `/jobs/${run.jobId}/runs`;
    const database = app.get(Sequelize);
    const statements: string[] = [];
    database.options.logging = (sql) => statements.push(sql.replace(/^Executing \([^)]*\): /, ''));
    const { body } = await call('get', `${path}?sort=${sort}&limit=1`, run.by);
    if (body.nextCursor) {
      await call('get', `${path}?sort=${sort}&limit=1&cursor=${body.nextCursor}`, run.by);
    }
    database.options.logging = false;
    const pages = statements.filter((sql) => sql.includes('sortValue'));
    expect(pages.length).toBeGreaterThanOrEqual(1);
    for (const sql of pages) {
      const plans = await database.query<Plan>(`EXPLAIN ${sql}`, { type: QueryTypes.SELECT });
      // Runs are cut in a table of their own and joined after: only the page is put in order again.
      const cut = list === 'jobs' ? plans : plans.filter((row) => row.select_type === 'DERIVED');
      expect(cut.length).toBeGreaterThanOrEqual(1);
      expect(cut[0]?.key).toContain(`${list === 'jobs' ? 'jobs' : 'run_revisions'}_by_`);
      for (const { Extra } of cut) expect(Extra).not.toMatch(/filesort|temporary/);
      if (list === 'runs') expect(cut[0]?.Extra).toContain('Using index');
    }
  });
});

describe('what a list refuses', () => {
  const cursor = (parts: unknown) => Buffer.from(JSON.stringify(parts)).toString('base64url');

  it.each([
    ['/sort', 'sort=passwordHash'],
    ['/sort', 'sort=deleted_at'],
    ['/sort', 'sort=__proto__'],
    ['/sort', 'sort=constructor'],
    ['/sort', 'sort=number;drop table jobs'],
    ['/sort', 'sort=--number'],
    ['/sort', 'sort=-'],
    ['/sort', 'sort=number&sort=name'],
    ['/limit', 'limit=0'],
    ['/limit', 'limit=101'],
    ['/limit', 'limit=-1'],
    ['/limit', 'limit=1e9'],
    ['/limit', 'limit=NaN'],
    ['/limit', 'limit=5&limit=6'],
    ['/status', 'status=won'],
    ['/status', 'status=done&status=active'],
    ['/search', `search=${'x'.repeat(81)}`],
    ['/search', 'search=a&search=b'],
    ['/cursor', 'cursor=x'],
    ['/cursor', 'cursor=null'],
    ['/cursor', `cursor=${cursor(['-updatedAt'])}`],
    ['/cursor', `cursor=${cursor(['-updatedAt', '2027-01-01', newId()])}`],
    ['/cursor', `cursor=${cursor(['-updatedAt', { $gt: '' }, newId()])}`],
    ['/cursor', `cursor=${cursor(['-updatedAt', '2027-01-01T00:00:00.000Z', "' OR 1=1 -- "])}`],
    ['/cursor', `cursor=${cursor(['number', 'J-1', newId()])}`],
    ['/cursor', `sort=number&cursor=${cursor(['number', 7, newId()])}`],
    ['/cursor', `sort=status&cursor=${cursor(['status', '1 or 1=1', newId()])}`],
    ['/cursor', `sort=dueDate&cursor=${cursor(['dueDate', '2027-99-99', newId()])}`],
    ['/companyId', 'companyId=x'],
    ['/id[$gt]', 'id[$gt]='],
  ])('%s in ?%s', async (pointer, query) => {
    const owner = await make.buildPerson();
    const { status, body } = await call('get', `/jobs?${encodeURI(query)}`, owner);
    expect(status).toBe(400);
    expect(body.code).toBe('validation-failed');
    expect(body.problems.map((problem: { pointer: string }) => problem.pointer)).toEqual([pointer]);
  });
});
