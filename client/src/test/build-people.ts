import type { Job, Me, SessionAnswer } from '@fairlead/shared';

/** An owner of a made-up shop. */
export const buildMe = (overrides: Partial<Me> = {}): Me => ({
  user: { id: 'user-1', name: 'Ada Ohm', email: 'ada@shop.test' },
  company: { id: 'company-1', name: 'Ohm and Daughters', timeZone: 'America/Denver' },
  role: 'owner',
  can: { createJobs: true },
  ...overrides,
});

export const buildSession = (accessToken: string): SessionAnswer => ({
  accessToken,
  expiresIn: 900,
  me: buildMe(),
});

export const buildJob = (overrides: Partial<Job> = {}): Job => ({
  id: 'job-1',
  number: '24-017',
  name: 'Mill Street clinic',
  address: '12 Mill Street',
  status: 'active',
  dueDate: null,
  people: [],
  runCount: 0,
  version: 1,
  createdAt: '2026-01-05T08:00:00.000Z',
  updatedAt: '2026-01-05T08:00:00.000Z',
  can: { update: true, delete: true, assignPeople: true, createRuns: true },
  ...overrides,
});
