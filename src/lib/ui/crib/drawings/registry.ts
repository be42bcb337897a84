import type { Component } from 'svelte';
import type { Drawing } from '$lib/domain/crib/drawing';
import BoltLoad from './BoltLoad.svelte';
import TorqueShares from './TorqueShares.svelte';
import TorqueAngle from './TorqueAngle.svelte';
import ThreadProfile from './ThreadProfile.svelte';
import Deck from './Deck.svelte';
import EndFloat from './EndFloat.svelte';
import Fit from './Fit.svelte';
import GaugingThread from './GaugingThread.svelte';
import RingGap from './RingGap.svelte';
import ShellChoice from './ShellChoice.svelte';
import ShellCrush from './ShellCrush.svelte';
import GridSection from './GridSection.svelte';
import PatternOrder from './PatternOrder.svelte';
import Wrench from './Wrench.svelte';
import CylinderVolumes from './CylinderVolumes.svelte';
import BoreAndStroke from './BoreAndStroke.svelte';
import LiquidLock from './LiquidLock.svelte';
import Firing from './Firing.svelte';
import DualScale from './DualScale.svelte';
import CylinderBars from './CylinderBars.svelte';
import Budget from './Budget.svelte';
import Clearance from './Clearance.svelte';
import Conformance from './Conformance.svelte';
import Face from './Face.svelte';
import GroupStudy from './GroupStudy.svelte';
import Rod from './Rod.svelte';
import Shims from './Shims.svelte';
import StageRounds from './StageRounds.svelte';
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
	'stage-rounds': StageRounds,
	turn: Turn,
	warm: Warm,
	budget: Budget,
	conformance: Conformance,
	'group-study': GroupStudy,
	'tool-zones': ToolZones,
	'bolt-load': BoltLoad,
	'torque-shares': TorqueShares,
	'torque-angle': TorqueAngle,
	'thread-profile': ThreadProfile,
	'grid-section': GridSection,
	deck: Deck,
	'end-float': EndFloat,
	fit: Fit,
	'gauging-thread': GaugingThread,
	'ring-gap': RingGap,
	'shell-choice': ShellChoice,
	'shell-crush': ShellCrush,
	'pattern-order': PatternOrder,
	wrench: Wrench,
	'cylinder-volumes': CylinderVolumes,
	'bore-and-stroke': BoreAndStroke,
	'liquid-lock': LiquidLock,
	firing: Firing,
	'dual-scale': DualScale,
	'cylinder-bars': CylinderBars
};

export function drawingComponent(kind: Drawing['kind']): Component<{ drawing: Drawing }> {
	return components[kind] as unknown as Component<{ drawing: Drawing }>;
}
