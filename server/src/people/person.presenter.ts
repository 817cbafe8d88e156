import type { Me } from '@fairlead/shared';
import { canCreateJobs } from '../jobs/job.policy';
import type { Viewer } from '../common/viewer';

export function presentMe(viewer: Viewer): Me {
  return {
    user: { id: viewer.userId, name: viewer.name, email: viewer.email },
    company: { id: viewer.companyId, name: viewer.companyName, timeZone: viewer.timeZone },
    role: viewer.role,
    can: { createJobs: canCreateJobs(viewer) },
  };
}
