/**
 * From a schema's issues to the one error object of the calculation contract: a dotted path that names the field,
 * a message that says what to do. Used by the API, the shell and the tablet alike.
 */
import type { z } from 'zod';
import type { InvalidInput } from '$lib/gear/contract';

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

export function invalidInput(issues: readonly Issue[], input: unknown): InvalidInput {
	return {
		error: { code: 'invalid-input', issues: issues.flatMap((issue) => flatten(issue, [], input)) }
	};
}

/** An error about the input as a whole. */
export function invalidWhole(message: string): InvalidInput {
	return { error: { code: 'invalid-input', issues: [{ path: '', message }] } };
}

function flatten(issue: Issue, base: Path, input: unknown): { path: string; message: string }[] {
	const path = [...base, ...issue.path];
	if (issue.code === 'unrecognized_keys') {
		return issue.keys.map((key) => ({ path: dotted([...path, key]), message: issue.message }));
	}
	if (issue.code === 'invalid_union') {
		const meant = issue.errors.find((branch) => isMeant(branch, path, input));
		if (meant) return meant.flatMap((inner) => flatten(inner, path, input));
	}
	return [{ path: dotted(path), message: issue.message }];
}

/** The alternative that was meant is the one whose complaints are all about fields that were in fact given. */
function isMeant(branch: readonly Issue[], base: Path, input: unknown): boolean {
	return branch.every(
		(issue) =>
			issue.path.length > 0 && issue.code !== 'unrecognized_keys' && isGiven(input, [...base, ...issue.path])
	);
}

function isGiven(input: unknown, path: Path): boolean {
	let at = input;
	for (const key of path) {
		if (typeof at !== 'object' || at === null || !Object.hasOwn(at, key)) return false;
		at = (at as Record<PropertyKey, unknown>)[key];
	}
	return at !== undefined;
}

function dotted(path: Path): string {
	return path.map(String).join('.');
}
