import { settlePayment as settle } from '../../services/cohorts/settle-payment';
import type { House } from '../../services/house';
import { system } from '$lib/domain/actor';

export async function settlePayment(
	house: House,
	payload: Record<string, unknown>
): Promise<void> {
	await settle({ house, actor: system, schoolId: undefined }, payload);
}
