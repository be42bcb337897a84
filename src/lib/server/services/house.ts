import type { Config } from '../config/env';
import type { Database } from '../data/database';
import type { Log } from '../log/log';
import type { Gateways } from '../gateways';
import type { Catalogue } from '$lib/content/catalogue';

/** What use cases stand on. Built once at start; tests build one with a fixed clock. */
export type House = {
	config: Config;
	database: Database;
	gateways: Gateways;
	catalogue: Catalogue;
	log: Log;
	now: () => Date;
	chance: (bytes: number) => Uint8Array<ArrayBuffer>;
};
