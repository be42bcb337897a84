import type { Outcome } from '$lib/kernel/outcome';
import type { DataSheet } from '../data-sheets/schema';
import type { Fields, System, ValuesOf } from './field';
import type { Worked } from './worked';

/** The crib's drawers, in the order in which an engine is measured and put together. */
export const drawers = [
	{ key: 'fasteners', words: 'Fasteners' },
	{ key: 'bores', words: 'Bores, journals, clearances' },
	{ key: 'faces', words: 'Faces, rods, valves' },
	{ key: 'cylinder', words: 'Cylinder' },
	{ key: 'measuring', words: 'Measuring and ruling' }
] as const;
export type Drawer = (typeof drawers)[number]['key'];

/** Values of a data sheet that fill some of the fields: typed as if by hand, in metric units. */
export type Preset = {
	/** The data sheet's key that they come from. */
	key: string;
	words: string;
	values: Record<string, string>;
};

/**
 * A calculator of the crib: what is typed, and one pure function over the kernel. Its page, its
 * link, its print and its place in the index exist by themselves.
 */
export type Calculator<F extends Fields = Fields> = {
	key: string;
	title: string;
	/** One sentence: what it tells. */
	says: string;
	drawer: Drawer;
	fields: F;
	/** Ids of the kernel's register: their rule and source stand on the page. */
	formulas: readonly string[];
	/** Further sources, and trade practice that has none. */
	sources?: readonly string[];
	/** What can hurt or ruin in this very job, before the usual words. */
	caution: string;
	/** Units that the page opens with where its trade uses no others. */
	opensIn?: System;
	// Methods, not function properties: that lets the registry hold calculators of different fields.
	work(values: ValuesOf<F>): Outcome<Worked>;
	presets?(sheet: DataSheet): Preset[];
};

/** Any calculator, as pages and the registry hold it. */
export type AnyCalculator = Calculator;

/** Keeps the types of the fields, so that `work` is given what they read. */
export function calculator<const F extends Fields>(given: Calculator<F>): Calculator<F> {
	return given;
}
