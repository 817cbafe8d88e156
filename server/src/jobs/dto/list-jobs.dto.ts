import { JOB_STATUSES } from '@fairlead/shared';
import type { JobStatus } from '@fairlead/shared';
import { ChoiceField } from '../../common/decorators/fields';
import { ListQueryDto } from '../../common/lists/list-query.dto';

export class ListJobsDto extends ListQueryDto {
  @ChoiceField(JOB_STATUSES, { optional: true })
  declare status?: JobStatus;
}
