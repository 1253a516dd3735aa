/**
 * Whether tablet and server came to the same: the same verdict and the same figures, to one part in 10^9.
 * Texts may differ, since two versions of the core may word a line differently; of two versions only the figures that
 * both have are compared.
 */
import type { Outcome } from '$lib/gear/contract';

const TOLERANCE = 1e-9;

export function outcomesAgree(tablet: Outcome, server: Outcome): boolean {
	const sameCore = tablet.core === server.core;
	return sameFigures(figuresOf(tablet), figuresOf(server), sameCore);
}

/** Everything that is a figure or names the law or table behind one. */
function figuresOf(outcome: Outcome): Omit<Outcome, 'core' | 'reasons' | 'remedies' | 'working'> {
	const { core: _core, reasons: _reasons, remedies: _remedies, working: _working, ...figures } = outcome;
	return figures;
}

function sameFigures(a: unknown, b: unknown, sameCore: boolean): boolean {
	if (!sameCore && (isNone(a) || isNone(b))) return true;
	if (typeof a === 'number' && typeof b === 'number') {
		return Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b));
	}
	if (typeof a === 'object' && typeof b === 'object' && a !== null && b !== null) {
		const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
		return [...keys].every((key) =>
			sameFigures((a as Record<string, unknown>)[key], (b as Record<string, unknown>)[key], sameCore)
		);
	}
	return a === b || (isNone(a) && isNone(b));
}

/** A field that an older core does not know yet says as much as one that is null, or an empty list. */
function isNone(value: unknown): boolean {
	return value === null || value === undefined || (Array.isArray(value) && value.length === 0);
}
