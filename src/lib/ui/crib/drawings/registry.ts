import type { Component } from 'svelte';
import type { Drawing } from '$lib/domain/crib/drawing';
import Clearance from './Clearance.svelte';

type Drawn = { [K in Drawing['kind']]: Component<{ drawing: Extract<Drawing, { kind: K }> }> };

/** One line a kind of drawing. */
const components: Drawn = {
	clearance: Clearance
};

export function drawingComponent(kind: Drawing['kind']): Component<{ drawing: Drawing }> {
	return components[kind] as unknown as Component<{ drawing: Drawing }>;
}
