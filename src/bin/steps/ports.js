import { createServer } from 'node:net';

/**
 * @param {string} host
 * @param {number} port 0 for any
 * @returns {Promise<number | string>} the port that could be bound, or why it could not
 */
export function tryPort(host, port) {
	return new Promise((resolve) => {
		const server = createServer();
		server.once('error', (/** @type {NodeJS.ErrnoException} */ error) =>
			resolve(error.code ?? error.message)
		);
		server.listen({ host, port, exclusive: true }, () => {
			const address = server.address();
			const bound = address && typeof address === 'object' ? address.port : port;
			server.close(() => resolve(bound));
		});
	});
}

/** Some free port of the loopback. @param {number} many @returns {Promise<number[]>} */
export async function freePorts(many) {
	/** @type {Set<number>} */
	const ports = new Set();
	while (ports.size < many) {
		const port = await tryPort('127.0.0.1', 0);
		if (typeof port === 'number') ports.add(port);
	}
	return [...ports];
}
