import { JOB_STATUSES, LIMITS } from '@fairlead/shared';
import type { JobStatus, UpdateJobBody } from '@fairlead/shared';
import {
  BaseVersionField,
  ChoiceField,
  DateField,
  TextField,
} from '../../common/decorators/fields';

export class UpdateJobDto implements UpdateJobBody {
  @BaseVersionField()
  declare baseVersion: number;

  @TextField({ max: LIMITS.jobNumber, optional: true })
  declare number?: string;

  @TextField({ max: LIMITS.jobName, optional: true })
  declare name?: string;

  @TextField({ min: 0, max: LIMITS.jobAddress, optional: true })
  declare address?: string;

  @ChoiceField(JOB_STATUSES, { optional: true })
  declare status?: JobStatus;

  @DateField({ optional: true, nullable: true })
  declare dueDate?: string | null;
}
