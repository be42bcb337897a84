import type { Component } from 'svelte';
import type { Drawing } from '$lib/domain/crib/drawing';
import Clearance from './Clearance.svelte';
import Face from './Face.svelte';
import Rod from './Rod.svelte';
import Shims from './Shims.svelte';
import Turn from './Turn.svelte';
import Warm from './Warm.svelte';

type Drawn = { [K in Drawing['kind']]: Component<{ drawing: Extract<Drawing, { kind: K }> }> };

/** One line a kind of drawing. */
const components: Drawn = {
	clearance: Clearance,
	face: Face,
	rod: Rod,
	shims: Shims,
	turn: Turn,
	warm: Warm
};

export function drawingComponent(kind: Drawing['kind']): Component<{ drawing: Drawing }> {
	return components[kind] as unknown as Component<{ drawing: Drawing }>;
}
