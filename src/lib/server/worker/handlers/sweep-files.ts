import { files } from '../../data/models';
import { count } from '../../data/rows';
import { commonScope, within } from '../../data/scope';
import type { House } from '../../services/house';

const dayMs = 24 * 3600 * 1000;

/** Removes files that no row knows: what an upload left behind that ended before its row. */
export async function sweepFiles(house: House): Promise<void> {
	const scope = commonScope(house.database, null);
	const isKnown = async (key: string) => {
		const [schoolId = '', , sha256 = ''] = key.split('/');
		return (await count(within(scope, schoolId), files, { sha256 })) > 0;
	};
	const untouchedSince = house.now().getTime() - dayMs;
	const { removed } = await house.gateways.storage.sweep(isKnown, untouchedSince);
	if (removed.length > 0) house.log.info({ removed: removed.length }, 'orphan files removed');
}
