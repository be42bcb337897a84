import type { ClearanceDrawing } from './drawings/clearance';

/**
 * What a calculator has drawn: one line a kind. Each kind's figures lie in `drawings/`, its
 * component in `ui/crib/drawings`; a kind without a component does not compile.
 */
export type Drawing = ClearanceDrawing;
