import { WorkerPool } from './worker-pool';

const PROGRAM = `
  const { parentPort, workerData } = require('node:worker_threads');
  parentPort.on('message', ({ id, task, args }) => {
    if (task === 'die') process.exit(1);
    if (task === 'fail') parentPort.postMessage({ id, error: 'no' });
    else parentPort.postMessage({ id, result: args.value + workerData.plus });
  });
`;

const pools: WorkerPool[] = [];
function pool(size = 2): WorkerPool {
  const made = new WorkerPool(PROGRAM, { plus: 1 }, size);
  pools.push(made);
  return made;
}
afterAll(() => Promise.all(pools.map((each) => each.close())));

it('gives each answer to whoever asked', async () => {
  const workers = pool();
  const answers = Array.from({ length: 50 }, (_, value) => workers.run<number>('add', { value }));
  expect(workers.waiting).toBe(50);
  expect(await Promise.all(answers)).toEqual(Array.from({ length: 50 }, (_, value) => value + 1));
  expect(workers.waiting).toBe(0);
});

it('passes a failure on', async () => {
  await expect(pool().run('fail', {})).rejects.toThrow('no');
});

it('fails what a dead thread held, and starts another', async () => {
  const workers = pool(1);
  await expect(workers.run('die', {})).rejects.toThrow('the worker stopped');
  expect(await workers.run('add', { value: 1 })).toBe(2);
});

it('takes nothing once closed', async () => {
  const workers = pool();
  await workers.close();
  await expect(workers.run('add', { value: 1 })).rejects.toThrow('closed');
});
