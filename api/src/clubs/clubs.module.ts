import { Module } from '@nestjs/common';
import { ClubAccess } from './club-access.js';

@Module({
  providers: [ClubAccess],
  exports: [ClubAccess],
})
export class ClubsModule {}
