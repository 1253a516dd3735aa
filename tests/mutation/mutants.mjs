// Every constant and every factor of the core's formulas, changed one at a time. Found in the syntax tree, so that a
// formula that is added is changed too: the numbers of a formula's function, and each use of its terms.
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';

/** Velocity laws, stress, wear and span: where the figures of a verdict and of an identification come from. */
export const FORMULA_FILES = [
	'velocity.ts',
	'bending.ts',
	'hertz.ts',
	'buckingham.ts',
	'load.ts',
	'measure/span.ts'
];

/**
 * Files that hold formulas among other things: of these the terms of each step of the working, and the numbers that
 * are reckoned with.
 */
export const MIXED_FILES = ['wear.ts', 'figures.ts', 'member.ts', 'pair-law.ts'];

/** By how much a factor is changed: more than the rounding of any published value that the tests hold. */
const CHANGE = 1.05;

/** @typedef {{ file: string, line: number, what: string, source: string }} Mutant */

/**
 * @param {string} folder of the core
 * @returns {Mutant[]}
 */
export function mutantsOf(folder) {
	return [...FORMULA_FILES, ...MIXED_FILES].flatMap((file) => {
		const path = join(folder, file);
		const source = readFileSync(path, 'utf8');
		const tree = ts.createSourceFile(path, source, ts.ScriptTarget.Latest, true);
		return placesIn(tree, MIXED_FILES.includes(file)).map(({ start, end }) => {
			const term = source.slice(start, end);
			return {
				file: path,
				line: tree.getLineAndCharacterOfPosition(start).line + 1,
				what: `${file}: ${term}`,
				source: `${source.slice(0, start)}(${term} * ${CHANGE})${source.slice(end)}`
			};
		});
	});
}

/**
 * @param {ts.SourceFile} tree
 * @param {boolean} mixed
 */
function placesIn(tree, mixed) {
	/** @type {{ start: number, end: number }[]} */
	const places = [];
	/**
	 * @param {ts.Node} node
	 * @param {ReadonlySet<string>} terms names that stand for figures here
	 */
	function visit(node, terms) {
		let inside = terms;
		if (ts.isArrowFunction(node) && (!mixed || isOfStep(node)))
			inside = new Set([...terms, ...node.parameters.flatMap(namesOf)]);
		const counted =
			(ts.isNumericLiteral(node) && isFigure(node) && (!mixed || isReckonedWith(node))) ||
			(ts.isIdentifier(node) && inside.has(node.text) && isUse(node));
		if (counted) places.push({ start: node.getStart(tree), end: node.getEnd() });
		// Types and the places where a name is introduced hold no figure.
		ts.forEachChild(node, (child) => {
			if (!ts.isTypeNode(child) && !ts.isParameter(child)) visit(child, inside);
		});
	}
	visit(tree, new Set());
	return places;
}

/** @param {ts.ParameterDeclaration} parameter */
function namesOf({ name }) {
	if (ts.isIdentifier(name)) return [name.text];
	return name.elements.flatMap((element) =>
		ts.isBindingElement(element) && ts.isIdentifier(element.name) ? [element.name.text] : []
	);
}

/**
 * What computes the figure of a line of the working.
 * @param {ts.ArrowFunction} node
 */
function isOfStep(node) {
	const { parent } = node;
	return (
		ts.isCallExpression(parent) &&
		ts.isPropertyAccessExpression(parent.expression) &&
		parent.expression.name.text === 'step' &&
		parent.arguments[2] === node
	);
}

/**
 * A constant, or a number in arithmetic; a tolerance for what arithmetic rounds is no figure.
 * @param {ts.NumericLiteral} node
 */
function isReckonedWith({ parent, text }) {
	if (Number(text) < 1e-6) return false;
	return ts.isVariableDeclaration(parent) || (ts.isBinaryExpression(parent) && isArithmetic(parent));
}

/** @param {ts.BinaryExpression} expression */
function isArithmetic({ operatorToken }) {
	return ['+', '-', '*', '/', '**'].includes(operatorToken.getText());
}

/**
 * A zero cannot be scaled, and a bound of 0 in a comparison is no factor.
 * @param {ts.NumericLiteral} node
 */
function isFigure(node) {
	return Number(node.text) !== 0;
}

/**
 * A use as a figure: not the name of a property, and not a call.
 * @param {ts.Identifier} node
 */
function isUse({ parent, text }) {
	if (ts.isPropertyAccessExpression(parent) || ts.isPropertyAssignment(parent)) return false;
	if (ts.isShorthandPropertyAssignment(parent) || ts.isBindingElement(parent)) return false;
	return !(
		ts.isCallExpression(parent) &&
		ts.isIdentifier(parent.expression) &&
		parent.expression.text === text
	);
}
