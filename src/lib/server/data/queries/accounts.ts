import { accounts } from '../models';
import { find } from '../rows';
import { acrossSchools, type Scope } from '../scope';

export function accountByEmail(scope: Scope, email: string) {
	return find(acrossSchools(scope), accounts, { email });
}

export function accountById(scope: Scope, id: string) {
	return find(acrossSchools(scope), accounts, { id });
}
