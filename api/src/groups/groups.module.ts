import { Module } from '@nestjs/common';
import { GroupsController } from './groups.controller';
import { GroupsService } from './groups.service';

@Module({ controllers: [GroupsController], providers: [GroupsService], exports: [GroupsService] })
export class GroupsModule {}
