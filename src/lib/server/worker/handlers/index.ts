import type { House } from '../../services/house';
import { sendMail } from './send-mail';
import { settlePayment } from './settle-payment';
import { signLedgerHeads } from './sign-ledger-heads';

/** One line a kind of job. Each can be run again: it asks first what is already done. */
export type Handler = (
	house: House,
	payload: Record<string, unknown>,
	attempt: number
) => Promise<void>;

export const handlers: Record<string, Handler> = {
	'send-mail': sendMail,
	'settle-payment': settlePayment,
	'sign-ledger-heads': signLedgerHeads
};
