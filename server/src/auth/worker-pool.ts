import { Worker } from 'node:worker_threads';

interface Answer {
  id: number;
  result?: unknown;
  error?: string;
}

interface Waiting {
  resolve: (result: never) => void;
  reject: (error: Error) => void;
  worker: Worker;
}

/** A few threads that take tasks in turn. A thread that dies fails its tasks and is replaced by the next one asked for. */
export class WorkerPool {
  private readonly workers: (Worker | undefined)[];
  private readonly tasks = new Map<number, Waiting>();
  private next = 0;
  private closed = false;

  constructor(
    private readonly program: string,
    private readonly workerData: object,
    size: number,
  ) {
    this.workers = new Array<Worker | undefined>(size).fill(undefined);
  }

  /** Tasks not answered yet. */
  get waiting(): number {
    return this.tasks.size;
  }

  run<T>(task: string, args: object): Promise<T> {
    if (this.closed) return Promise.reject(new Error('the workers have been closed'));
    const id = this.next;
    this.next += 1;
    const worker = this.workerAt(id % this.workers.length);
    return new Promise<T>((resolve, reject) => {
      this.tasks.set(id, { resolve, reject, worker });
      worker.postMessage({ id, task, args });
    });
  }

  async close(): Promise<void> {
    this.closed = true;
    await Promise.all(this.workers.map((worker) => worker?.terminate()));
  }

  private workerAt(index: number): Worker {
    const existing = this.workers[index];
    if (existing) return existing;
    const worker = new Worker(this.program, { eval: true, workerData: this.workerData });
    // An idle thread must not keep the process alive.
    worker.unref();
    worker.on('message', (answer: Answer) => this.settle(answer));
    worker.on('error', (error) => this.fail(worker, error));
    worker.on('exit', () => {
      this.workers[index] = undefined;
      this.fail(worker, new Error('the worker stopped'));
    });
    this.workers[index] = worker;
    return worker;
  }

  private settle({ id, result, error }: Answer): void {
    const task = this.tasks.get(id);
    this.tasks.delete(id);
    if (error === undefined) task?.resolve(result as never);
    else task?.reject(new Error(error));
  }

  private fail(worker: Worker, error: Error): void {
    for (const [id, task] of this.tasks) {
      if (task.worker !== worker) continue;
      this.tasks.delete(id);
      task.reject(error);
    }
  }
}
