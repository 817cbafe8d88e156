import type { Role } from '@fairlead/shared';

/** Whoever made the request, as the database knows them at that moment. */
export interface Viewer {
  userId: string;
  name: string;
  email: string;
  role: Role;
  companyId: string;
  companyName: string;
  timeZone: string;
  sessionId: string;
}
