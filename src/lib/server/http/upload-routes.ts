/** Routes whose bodies stream to the disk within limits of their own; none calls `formData()`. */
export const uploadRoutes: ReadonlySet<string> = new Set([
	'/api/v1/schools/[school]/submissions/[submission]/photographs'
]);
