import { AttemptCount } from './attempts/attempt-count.entity.js';

export const PLATFORM_ENTITIES = [AttemptCount];
