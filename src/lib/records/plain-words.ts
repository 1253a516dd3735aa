/**
 * How schemas speak: every message names the field and the remedy in plain words. A field that is missing, has the
 * wrong shape or is out of range gets the same sentence, so nobody has to learn a schema's vocabulary.
 */
import { z } from 'zod';

interface RawIssue {
	code?: string | undefined;
	input?: unknown;
}

/** "Teeth must be a whole number of at least 1." */
export function must(name: string, what: string) {
	return { error: ({ input }: RawIssue) => mustWords(name, what, input) };
}

export function oneOf(name: string, words: readonly (string | number)[]) {
	return must(name, `one of ${words.join(', ')}`);
}

/** For a strict object: which fields it knows, when it gets another one or is no object at all. */
export function fields(name: string, known: readonly string[]) {
	const list = known.join(', ');
	return {
		error: ({ code, input }: RawIssue) =>
			code === 'unrecognized_keys'
				? `This field is not known here. ${name} has: ${list}. Correct its name or leave it out.`
				: mustWords(name, `an object with ${list}`, input)
	};
}

/** A strict object that says, when it cannot be read, which fields it has. */
export function strictFields<Shape extends z.core.$ZodShape>(name: string, shape: Shape) {
	return z.strictObject(shape, fields(name, Object.keys(shape)));
}

function mustWords(name: string, what: string, input: unknown): string {
	return input === undefined ? `${name} is missing: it must be ${what}.` : `${name} must be ${what}.`;
}
