import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Company } from './models/company.model';
import { Membership } from './models/membership.model';
import { User } from './models/user.model';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';

@Module({
  imports: [SequelizeModule.forFeature([Company, User, Membership])],
  controllers: [PeopleController],
  providers: [PeopleService],
  exports: [PeopleService],
})
export class PeopleModule {}
