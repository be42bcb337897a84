import {
	closeSync,
	existsSync,
	fsyncSync,
	mkdirSync,
	openSync,
	readFileSync,
	renameSync,
	writeFileSync
} from 'node:fs';
import { dirname } from 'node:path';
import { randomBytes } from 'node:crypto';

/**
 * @typedef {Record<string, any> & { id: string, object: string, created: number }} Thing one object as the API shows it
 * @typedef {{ eventId: string, tries: number, nextAtMs: number }} Delivery
 * @typedef {{ fingerprint: string, status: number, body: unknown, atMs: number }} Answered
 * @typedef {object} TillState
 * @property {Record<string, Thing>} things
 * @property {Record<string, Answered>} answered by idempotency key
 * @property {Delivery[]} deliveries webhooks still to be taken
 */

const dayMs = 86_400_000;

/**
 * Everything the till knows, in one file that is replaced whole at each change.
 * @param {string} file
 */
export function tillStore(file) {
	mkdirSync(dirname(file), { recursive: true, mode: 0o700 });
	/** @type {TillState} */
	const state = existsSync(file)
		? JSON.parse(readFileSync(file, 'utf8'))
		: { things: {}, answered: {}, deliveries: [] };

	return {
		state,
		/** @param {string} id @param {string} object @returns {Thing | undefined} */
		find(id, object) {
			const thing = state.things[id];
			return thing?.object === object ? thing : undefined;
		},
		/** @param {string} object @returns {Thing[]} newest first */
		all(object) {
			return Object.values(state.things)
				.filter((one) => one.object === object)
				.reverse();
		},
		/**
		 * @param {string} prefix
		 * @param {string} object
		 * @param {Record<string, unknown>} fields
		 * @returns {Thing}
		 */
		add(prefix, object, fields) {
			const id = `${prefix}_${randomBytes(12).toString('hex')}`;
			const thing = { id, object, created: nowS(), livemode: false, ...fields };
			state.things[id] = thing;
			return thing;
		},
		save() {
			for (const [key, { atMs }] of Object.entries(state.answered))
				if (atMs < Date.now() - dayMs) delete state.answered[key];
			const aside = `${file}.${process.pid}`;
			const handle = openSync(aside, 'w', 0o600);
			writeFileSync(handle, JSON.stringify(state));
			fsyncSync(handle);
			closeSync(handle);
			renameSync(aside, file);
		}
	};
}

/** @typedef {ReturnType<typeof tillStore>} TillStore */

/** Stripe tells time in whole seconds. */
export const nowS = () => Math.floor(Date.now() / 1000);
