import type { RunListFilter, Status } from '@fairlead/shared';
import { ChoiceField } from '../../common/decorators/fields';
import { ListQueryDto } from '../../common/lists/list-query.dto';

const STATUSES: readonly Status[] = ['ok', 'watch', 'over', 'no-answer'];

export class ListRunsDto extends ListQueryDto implements RunListFilter {
  @ChoiceField(STATUSES, { optional: true })
  declare status?: Status;
}
