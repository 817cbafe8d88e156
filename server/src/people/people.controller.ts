import { Controller, Get } from '@nestjs/common';
import type { Person } from '@fairlead/shared';
import { Can } from '../common/decorators/access';
import { CurrentViewer } from '../common/decorators/viewer';
import type { Viewer } from '../common/viewer';
import { PeopleService } from './people.service';

@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleService) {}

  @Can('people.list')
  @Get()
  list(@CurrentViewer() viewer: Viewer): Promise<Person[]> {
    return this.people.list(viewer.companyId);
  }
}
