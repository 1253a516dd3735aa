// A folder of its own for one test, gone after it.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

export function testFolder(): string {
	const folder = mkdtempSync(join(tmpdir(), 'cogmark-scripts-'));
	onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
	return folder;
}
