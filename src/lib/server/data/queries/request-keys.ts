import { requestKeys } from '../models';
import { find, insert } from '../rows';
import { acrossSchools, type Scope } from '../scope';

type Key = { owner: string; requestKey: string };

export function findRequest(scope: Scope, { owner, requestKey }: Key) {
	return find(acrossSchools(scope), requestKeys, { owner, requestKey });
}

export function keepAnswer(
	scope: Scope,
	row: Key & { useCase: string; requestHash: string; answer: unknown; at: string }
) {
	return insert(acrossSchools(scope), requestKeys, row);
}
