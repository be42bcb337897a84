import type { BoreAndStrokeDrawing } from './drawings/bore-and-stroke';
import type { LiquidLockDrawing } from './drawings/liquid-lock';
import type { FiringDrawing } from './drawings/firing';
import type { DualScaleDrawing } from './drawings/dual-scale';
import type { CylinderBarsDrawing } from './drawings/cylinder-bars';
import type { CylinderVolumesDrawing } from './drawings/cylinder-volumes';
import type { WrenchDrawing } from './drawings/wrench';
import type { PatternOrderDrawing } from './drawings/pattern-order';
import type { DeckDrawing } from './drawings/deck';
import type { EndFloatDrawing } from './drawings/end-float';
import type { FitDrawing } from './drawings/fit';
import type { GaugingThreadDrawing } from './drawings/gauging-thread';
import type { RingGapDrawing } from './drawings/ring-gap';
import type { ShellChoiceDrawing } from './drawings/shell-choice';
import type { ShellCrushDrawing } from './drawings/shell-crush';
import type { GridSectionDrawing } from './drawings/grid-section';
import type { ThreadProfileDrawing } from './drawings/thread-profile';
import type { TorqueAngleDrawing } from './drawings/torque-angle';
import type { TorqueSharesDrawing } from './drawings/torque-shares';
import type { BoltLoadDrawing } from './drawings/bolt-load';
import type { BudgetDrawing } from './drawings/budget';
import type { ClearanceDrawing } from './drawings/clearance';
import type { ConformanceDrawing } from './drawings/conformance';
import type { FaceDrawing } from './drawings/face';
import type { GroupStudyDrawing } from './drawings/group-study';
import type { RodDrawing } from './drawings/rod';
import type { ShimsDrawing } from './drawings/shims';
import type { StageRoundsDrawing } from './drawings/stage-rounds';
import type { ToolZonesDrawing } from './drawings/tool-zones';
import type { TurnDrawing } from './drawings/turn';
import type { WarmDrawing } from './drawings/warm';

/**
 * What a calculator has drawn: one line a kind. Each kind's figures lie in `drawings/`, its
 * component in `ui/crib/drawings`; a kind without a component does not compile.
 */
export type Drawing =
	| ClearanceDrawing
	| FaceDrawing
	| RodDrawing
	| ShimsDrawing
	| StageRoundsDrawing
	| TurnDrawing
	| WarmDrawing
	| BudgetDrawing
	| ConformanceDrawing
	| GroupStudyDrawing
	| ToolZonesDrawing
	| BoltLoadDrawing
	| TorqueSharesDrawing
	| TorqueAngleDrawing
	| ThreadProfileDrawing
	| GridSectionDrawing
	| DeckDrawing
	| EndFloatDrawing
	| FitDrawing
	| GaugingThreadDrawing
	| RingGapDrawing
	| ShellChoiceDrawing
	| ShellCrushDrawing
	| PatternOrderDrawing
	| WrenchDrawing
	| CylinderVolumesDrawing
	| BoreAndStrokeDrawing
	| LiquidLockDrawing
	| FiringDrawing
	| DualScaleDrawing
	| CylinderBarsDrawing;
