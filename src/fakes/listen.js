/**
 * @typedef {object} Address
 * @property {number} port
 * @property {() => Promise<void>} close
 */

/**
 * A fake shows letters with links that sign people in, so it listens on the loopback and nowhere
 * else; there is no setting for it.
 * @param {{ listen(port: number, host: string, done: () => void): unknown, once(name: 'error', act: (error: Error) => void): unknown, off(name: 'error', act: (error: Error) => void): unknown }} server
 * @param {number} port 0 for any
 * @returns {Promise<void>}
 */
export function listenOnLoopback(server, port) {
	return new Promise((resolve, reject) => {
		server.once('error', reject);
		server.listen(port, '127.0.0.1', () => {
			server.off('error', reject);
			resolve();
		});
	});
}

/**
 * @param {import('node:http').Server} server
 * @returns {Promise<void>}
 */
export function closeNow(server) {
	return new Promise((resolve) => {
		server.close(() => resolve());
		server.closeAllConnections();
	});
}

/** @param {import('node:http').Server} server */
export function portOf(server) {
	const address = server.address();
	if (!address || typeof address === 'string') throw new Error('The server is not listening.');
	return address.port;
}
