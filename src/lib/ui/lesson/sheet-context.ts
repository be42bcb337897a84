import { getContext, setContext } from 'svelte';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import { sheetContext } from '$lib/domain/data-sheets/sheet-context';

/** A page gives the lesson in it one revision of a data sheet. An object, so that it can change. */
export function giveSheet(held: { readonly sheet: DataSheet }): void {
	setContext(sheetContext, held);
}

export function sheetHere(): DataSheet {
	const held = getContext<{ sheet: DataSheet } | undefined>(sheetContext);
	if (!held) throw new Error('a value of the data sheet stands outside a lesson');
	return held.sheet;
}
