import type { Component } from 'svelte';
import type { Drawing } from '$lib/domain/crib/drawing';
import BoltLoad from './BoltLoad.svelte';
import TorqueShares from './TorqueShares.svelte';
import TorqueAngle from './TorqueAngle.svelte';
import ThreadProfile from './ThreadProfile.svelte';
import Budget from './Budget.svelte';
import Clearance from './Clearance.svelte';
import Conformance from './Conformance.svelte';
import Face from './Face.svelte';
import GroupStudy from './GroupStudy.svelte';
import Rod from './Rod.svelte';
import Shims from './Shims.svelte';
import ToolZones from './ToolZones.svelte';
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
	warm: Warm,
	budget: Budget,
	conformance: Conformance,
	'group-study': GroupStudy,
	'tool-zones': ToolZones,
	'bolt-load': BoltLoad,
	'torque-shares': TorqueShares,
	'torque-angle': TorqueAngle,
	'thread-profile': ThreadProfile
};

export function drawingComponent(kind: Drawing['kind']): Component<{ drawing: Drawing }> {
	return components[kind] as unknown as Component<{ drawing: Drawing }>;
}
