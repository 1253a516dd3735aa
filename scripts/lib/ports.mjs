// Ports of this machine: whether one is free, and a free one to use. Tells by listening for a moment, since
// that is the one answer that counts.
import { createServer } from 'node:net';
import { Trouble } from './say.mjs';

/**
 * @param {number} port 0 for any free one
 * @param {string} host
 * @returns {Promise<{ port: number } | { code: string }>} the port listened on, or why that was refused
 */
function tryListening(port, host) {
	return new Promise((resolve) => {
		const server = createServer();
		server.once('error', (error) => resolve({ code: 'code' in error ? String(error.code) : error.message }));
		server.listen({ port, host, exclusive: true }, () => {
			const address = server.address();
			const used = address !== null && typeof address === 'object' ? address.port : port;
			server.close(() => resolve({ port: used }));
		});
	});
}

/**
 * @param {number} port
 * @param {string} [host]
 */
export async function isFree(port, host = '127.0.0.1') {
	return 'port' in (await tryListening(port, host));
}

/** @returns {Promise<number>} a port of the loopback address on which nobody listens */
export async function freePort() {
	const found = await tryListening(0, '127.0.0.1');
	if ('port' in found) return found.port;
	throw new Trouble(
		`This machine gives no port on 127.0.0.1 (${found.code}).`,
		'Check that the loopback network is up.'
	);
}

/**
 * Fails with a sentence when the application could not listen there.
 * @param {number} port
 * @param {string} host
 */
export async function requireFreePort(port, host) {
	const found = await tryListening(port, host);
	if ('port' in found) return;
	switch (found.code) {
		case 'EADDRINUSE':
			throw new Trouble(
				`Port ${port} is in use by another program.`,
				`Stop that program, or choose another port, for example: PORT=${port + 1} npm start`
			);
		case 'EACCES':
			throw new Trouble(
				`This user may not listen on port ${port}.`,
				'Choose a port above 1023, for example: PORT=4280 npm start'
			);
		default:
			throw new Trouble(
				`Cannot listen on ${host}, port ${port} (${found.code}).`,
				'HOST must be an address of this machine: 127.0.0.1 for this machine only, 0.0.0.0 for every network.'
			);
	}
}
