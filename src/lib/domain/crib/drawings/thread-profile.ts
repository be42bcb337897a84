/** The 60° profile of a thread with its diameters, mm. */
export type ThreadProfileDrawing = {
	kind: 'thread-profile';
	diameterMm: number;
	pitchMm: number;
	pitchDiameterMm: number;
	rootDiameterMm: number;
	name: string;
};
