import { Club } from './club.entity.js';
import { Membership } from './membership.entity.js';

export const CLUB_ENTITIES = [Club, Membership];
