import { system } from '$lib/domain/actor';
import { forgetExpired } from '../../services/accounts/forget-expired';
import { sendAccountLink } from '../../services/accounts/send-account-link';
import { proposeAward } from '../../services/awards/propose-award';
import { settlePayment } from '../../services/cohorts/settle-payment';
import type { House } from '../../services/house';
import { endOverdueSittings } from '../../services/quizzes/end-sitting';
import { copyPhotograph } from '../../services/submissions/copy-photograph';
import type { Caller } from '../../services/use-case';
import { sendMail } from './send-mail';
import { signLedgerHeads } from './sign-ledger-heads';
import { sweepFiles } from './sweep-files';

/** One line a kind of job. Each can be run again: it asks first what is already done. */
export type Handler = (
	house: House,
	payload: Record<string, unknown>,
	attempt: number
) => Promise<unknown>;

export const handlers: Record<string, Handler> = {
	'send-mail': sendMail,
	'sweep-files': sweepFiles,
	'sign-ledger-heads': signLedgerHeads,
	'send-account-link': asSystem(sendAccountLink),
	'forget-expired': asSystem(forgetExpired),
	'settle-payment': asSystem(settlePayment),
	'copy-photograph': asSystem(copyPhotograph),
	'propose-award': asSystem(proposeAward),
	'end-overdue-sittings': asSystem(endOverdueSittings)
};

/** A use case that the house itself runs. */
function asSystem(useCase: (caller: Caller, input: unknown) => Promise<unknown>): Handler {
	return (house, payload) => useCase({ house, actor: system, schoolId: undefined }, payload);
}
