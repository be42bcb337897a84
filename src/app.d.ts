import '@auth/sveltekit';
import type { Actor } from '$lib/domain/actor';
import type { SchoolFace } from '$lib/server/services/accounts/find-school';
import type { House } from '$lib/server/services/house';
import type { Caller } from '$lib/server/services/use-case';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** Under which the log has what happened; shown to the person. */
			id?: string;
		}
		interface Locals {
			house: House;
			requestId: string;
			/** Who asks: read once, when somebody wants to know. */
			actor: () => Promise<Actor>;
			/** The school of the address; undefined where it names none, or one that is not there. */
			school?: SchoolFace;
			/** For use cases. @throws Problem 'absent' where the address names no school that exists */
			caller: (requestKey?: string) => Promise<Caller>;
			/** The device's mark, once it was renewed in this request. */
			keptDevice?: string;
		}
	}
}

export {};
