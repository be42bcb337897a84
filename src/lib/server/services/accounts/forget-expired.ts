import { z } from 'zod';
import { jobs, knownDevices, requestKeys, sessions, tokens } from '../../data/models';
import { forgetOldTries } from '../../data/queries/sign-in-tries';
import { remove } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { writeCase } from '../use-case';

const dayMs = 24 * 3600 * 1000;

/**
 * Clears away, once a day, what opens nothing any more: ended sessions and links, old tries,
 * devices not seen for a year, jobs done a week ago, and answers that no client will ask for again.
 */
export const forgetExpired = writeCase({
	name: 'forget-expired',
	action: 'system:run',
	where: 'common',
	input: z.object({}).loose(),
	subject: () => Promise.resolve({}),
	async run({ scope, at }) {
		const common = acrossSchools(scope);
		const before = (days: number) => new Date(at.getTime() - days * dayMs).toISOString();
		const now = at.toISOString();
		await remove(common, sessions, { expiresAt: { atMost: now } });
		await remove(common, tokens, { expiresAt: { atMost: now } });
		await forgetOldTries(scope, new Date(before(2)));
		await remove(common, knownDevices, { seenAt: { below: before(365) } });
		await remove(common, jobs, { state: 'done', endedAt: { below: before(7) } });
		// A phone may have lain in a drawer with unsent work for a term.
		await remove(common, requestKeys, { at: { below: before(180) } });
	}
});
