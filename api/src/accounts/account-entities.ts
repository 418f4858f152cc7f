import { Account } from './account.entity.js';
import { DeviceSession } from './device-session.entity.js';
import { MailToken } from './mail-token.entity.js';
import { RefreshToken } from './refresh-token.entity.js';

export const ACCOUNT_ENTITIES = [Account, DeviceSession, RefreshToken, MailToken];
