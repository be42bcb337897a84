export type { Delivery } from './delivery';
export { makeMailer, type Letter, type Mailer } from './mailer';
