import { requestDueMail } from '../server/mail/request-mail';
import { sendDueMail } from '../server/mail/send-due-mail';
import type { Job } from './job';

/** Sends what waits in the outbox; asked for when a mail is written, and every minute for those to be tried again. */
export const mailJob: Job = {
  name: 'mail',
  schedule: ['* * * * *'],
  request: requestDueMail,
  run: sendDueMail,
};
