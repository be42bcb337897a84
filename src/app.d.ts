import '@auth/sveltekit';
import type { Actor, Membership } from '$lib/domain/actor';
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
			/** Who asks: read from the session once, when somebody wants to know. */
			actor: () => Promise<Actor>;
			/** The school of the address, with the asker's membership in it. */
			school?: { id: string; slug: string; name: string; locale: string; timeZone: string };
			membership?: Membership;
			caller: (requestKey?: string) => Promise<Caller>;
		}
	}
}

export {};
