import { OutgoingMail } from './outgoing-mail.entity.js';

export const MAIL_ENTITIES = [OutgoingMail];
