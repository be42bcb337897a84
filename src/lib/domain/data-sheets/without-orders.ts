import type { DataSheet } from './schema';

/** The sheet without its printed tightening orders, for somebody who is asked for one just now. */
export function withoutOrders(sheet: DataSheet): DataSheet {
	return {
		...sheet,
		patterns: sheet.patterns.map(({ key, words, fastener, bolts }) => ({
			key,
			words,
			fastener,
			bolts
		}))
	};
}
