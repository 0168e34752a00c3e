export { type Delivery, deliverWaiting } from './deliver-waiting';
export { startFakeSmtp } from './mail-server';
export { queueMails } from './queue-mails';
export { listMails, readMail } from './read-mails';
export { renderRosterMails } from './render-mails';
export { nudgeSender, startSender } from './sender';
