// Port checks against real listeners.
import { createServer } from 'node:net';
import { expect, onTestFinished, test } from 'vitest';
import { freePort, isFree, requireFreePort } from '../../../scripts/lib/ports.mjs';

async function listen(port: number): Promise<void> {
	const server = createServer();
	await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
	onTestFinished(() => void server.close());
}

test('a free port can be listened on', async () => {
	const port = await freePort();
	expect(await isFree(port)).toBe(true);
	await requireFreePort(port, '127.0.0.1');
	await listen(port);
	expect(await isFree(port)).toBe(false);
});

test('a used port is told with its number and PORT as the remedy', async () => {
	const port = await freePort();
	await listen(port);
	await expect(requireFreePort(port, '127.0.0.1')).rejects.toMatchObject({
		message: `Port ${port} is in use by another program.`,
		remedy: expect.stringContaining(`PORT=${port + 1} npm start`)
	});
	await expect(requireFreePort(port, '0.0.0.0')).rejects.toThrow(`Port ${port} is in use`);
});

test('an address that is not of this machine is told with HOST as the remedy', async () => {
	// RFC 5737 reserves 192.0.2.0/24 for documentation, so no machine has it.
	await expect(requireFreePort(await freePort(), '192.0.2.1')).rejects.toMatchObject({
		remedy: expect.stringContaining('HOST')
	});
});
