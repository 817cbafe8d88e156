export const ROLES = ['owner', 'estimator', 'foreman', 'crew'] as const;
export type Role = (typeof ROLES)[number];
