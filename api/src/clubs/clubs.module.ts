import { Module } from '@nestjs/common';
import { ClubAccess } from './club-access.js';
import { ClubDirectory } from './club-directory.js';
import { ClubJoining } from './club-joining.js';
import { ClubPeople } from './club-people.js';
import { ClubsController } from './clubs.controller.js';
import { MembersController } from './members.controller.js';
import { MyLog } from './my-log.js';

/** Clubs, the people in them, and what each may do there. */
@Module({
  controllers: [ClubsController, MembersController],
  providers: [ClubAccess, ClubDirectory, ClubJoining, ClubPeople, MyLog],
  exports: [ClubAccess, ClubDirectory, MyLog],
})
export class ClubsModule {}
