import { LIMITS } from '@fairlead/shared';
import { QueryIntegerField, TextField } from '../decorators/fields';

/** What every list can be asked for. */
export class ListQueryDto {
  @QueryIntegerField({ min: 1, max: LIMITS.pageSize })
  declare limit?: number;

  @TextField({ max: 2000, optional: true })
  declare cursor?: string;

  @TextField({ max: 40, optional: true })
  declare sort?: string;

  @TextField({ min: 0, max: LIMITS.search, optional: true })
  declare search?: string;
}
