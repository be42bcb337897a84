import type { DataSheet } from '../schema';

/**
 * What a check of a data sheet found. `refused` cannot be right and is not published; `warned` may
 * be right and must be read before it is.
 */
export type Finding = { severity: 'refused' | 'warned'; at: string; says: string };

/** One rule: looks at the whole sheet, computes, and says what does not agree. */
export type Check = (sheet: DataSheet) => Finding[];

export function refused(at: string, says: string): Finding {
	return { severity: 'refused', at, says };
}

export function warned(at: string, says: string): Finding {
	return { severity: 'warned', at, says };
}
