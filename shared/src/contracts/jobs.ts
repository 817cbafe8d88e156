import type { Role } from './roles';

export const JOB_STATUSES = ['bidding', 'active', 'on-hold', 'done'] as const;
export type JobStatus = (typeof JOB_STATUSES)[number];
export const JOB_SORTS = ['updatedAt', 'number', 'name', 'dueDate', 'status'] as const;
export type JobSort = (typeof JOB_SORTS)[number];

/** A person as others in the company see them. */
export interface Person {
  id: string;
  name: string;
  role: Role;
}

export interface Job {
  id: string;
  number: string;
  name: string;
  address: string;
  status: JobStatus;
  /** YYYY-MM-DD. */
  dueDate: string | null;
  people: Person[];
  runCount: number;
  version: number;
  createdAt: string;
  updatedAt: string;
  can: { update: boolean; delete: boolean; assignPeople: boolean; createRuns: boolean };
}

export interface CreateJobBody {
  id: string;
  number: string;
  name: string;
  address?: string;
  status?: JobStatus;
  dueDate?: string | null;
}

export interface UpdateJobBody {
  baseVersion: number;
  number?: string;
  name?: string;
  address?: string;
  status?: JobStatus;
  dueDate?: string | null;
}
