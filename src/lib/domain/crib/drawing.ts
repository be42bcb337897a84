import type { ClearanceDrawing } from './drawings/clearance';
import type { FaceDrawing } from './drawings/face';
import type { RodDrawing } from './drawings/rod';
import type { ShimsDrawing } from './drawings/shims';
import type { TurnDrawing } from './drawings/turn';
import type { WarmDrawing } from './drawings/warm';

/**
 * What a calculator has drawn: one line a kind. Each kind's figures lie in `drawings/`, its
 * component in `ui/crib/drawings`; a kind without a component does not compile.
 */
export type Drawing =
	ClearanceDrawing | FaceDrawing | RodDrawing | ShimsDrawing | TurnDrawing | WarmDrawing;
