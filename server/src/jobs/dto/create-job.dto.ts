import { JOB_STATUSES, LIMITS } from '@fairlead/shared';
import type { CreateJobBody, JobStatus } from '@fairlead/shared';
import { ChoiceField, DateField, IdField, TextField } from '../../common/decorators/fields';

export class CreateJobDto implements CreateJobBody {
  @IdField()
  declare id: string;

  @TextField({ max: LIMITS.jobNumber })
  declare number: string;

  @TextField({ max: LIMITS.jobName })
  declare name: string;

  @TextField({ min: 0, max: LIMITS.jobAddress, optional: true })
  declare address?: string;

  @ChoiceField(JOB_STATUSES, { optional: true })
  declare status?: JobStatus;

  @DateField({ optional: true, nullable: true })
  declare dueDate?: string | null;
}
