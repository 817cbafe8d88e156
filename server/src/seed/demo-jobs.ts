import type { JobStatus, Role } from '@fairlead/shared';
import type { DemoRun } from './demo-run';
import { CLINIC_RUNS } from './demo-runs-clinic';
import { SCHOOL_RUNS } from './demo-runs-school';
import { WAREHOUSE_RUNS } from './demo-runs-warehouse';

export interface DemoJob {
  number: string;
  name: string;
  address: string;
  status: JobStatus;
  /** Days from the seed to the due date. */
  dueInDays: number | null;
  /** Who is assigned; one person per role. */
  people: readonly Role[];
  runs: readonly DemoRun[];
}

/** Invented jobs. Between them their runs hold every kind of element and every status. */
export const DEMO_JOBS: readonly DemoJob[] = [
  {
    number: '2620',
    name: 'Cedar School gym',
    address: '900 Cedar Avenue',
    status: 'bidding',
    dueInDays: 12,
    people: ['estimator'],
    runs: SCHOOL_RUNS,
  },
  {
    number: '2614',
    name: 'Mill Road warehouse',
    address: '31 Mill Road',
    status: 'active',
    dueInDays: 75,
    people: ['foreman'],
    runs: WAREHOUSE_RUNS,
  },
  {
    number: '2611',
    name: 'Harbor Street clinic',
    address: '18 Harbor Street, level 1 and roof',
    status: 'active',
    dueInDays: 30,
    people: ['foreman', 'crew'],
    runs: CLINIC_RUNS,
  },
];
