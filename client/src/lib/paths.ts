/** Every URL of the product, in one place. */
export const paths = {
  signIn: '/sign-in',
  signUp: '/sign-up',
  jobs: '/jobs',
  job: (jobId: string) => `/jobs/${jobId}`,
  run: (jobId: string, runId: string) => `/jobs/${jobId}/runs/${runId}`,
  company: '/company',
  me: '/me',
} as const;
