/** What the API answers with an error, in Stripe's words: a status and `{ error: … }`. */
export class Refusal extends Error {
	/**
	 * @param {number} status
	 * @param {{ type?: string, code?: string, message: string, param?: string }} error
	 */
	constructor(status, error) {
		super(error.message);
		this.status = status;
		this.error = { type: 'invalid_request_error', ...error };
	}
}

/** @param {string} kind @param {string} id */
export const missing = (kind, id) =>
	new Refusal(404, { code: 'resource_missing', message: `No such ${kind}: '${id}'`, param: 'id' });

/** @param {string} param @param {string} message */
export const wrong = (param, message) =>
	new Refusal(400, { code: 'parameter_invalid', message, param });
