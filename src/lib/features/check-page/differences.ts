/**
 * Where the tablet's outcome and the server's differ, figure by figure, for a page that must not hide it. What
 * counts as different is what the server decided by when the record arrived.
 */
import { decidingMargin } from '$lib/features/verdict/limit-rows';
import type { Outcome } from '$lib/gear/contract';
import type { MessageKey } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure, fixed } from '$lib/i18n/format';

export interface Difference {
	name: string;
	tablet: string;
	server: string;
}

type FigureName = {
	[Name in keyof Outcome]-?: Outcome[Name] extends number | null ? Name : never;
}[keyof Outcome];

/** Figures with the words and the unit in which they are compared. */
const FIGURES: readonly [FigureName, MessageKey, string][] = [
	['bendingMargin', 'working.margin in bending', ''],
	['bendingMarginLow', 'working.low end of the margin', ''],
	['bendingStress', 'working.bending stress, velocity and service factors in', 'MPa'],
	['allowableBending', 'working.allowable bending stress of the material', 'MPa'],
	['formFactor', 'working.Lewis form factor that counts, by the rule of the plant', ''],
	['velocityFactor', 'working.velocity factor', ''],
	['pitchLineVelocity', 'working.pitch-line velocity', 'm/s'],
	['tangentialForce', 'working.tangential force', 'N'],
	['designForce', 'working.design force', 'N'],
	['module', 'working.module', 'mm'],
	['pitchDiameter', 'working.pitch diameter', 'mm'],
	['permittedPower', "working.power at the plant's margin and this speed", 'W'],
	['permittedTorque', "working.torque at the plant's margin and this speed", 'N·m']
];

/** One part in 10^9, as the server compares them. */
const TOLERANCE = 1e-9;

export function differences(tablet: Outcome, server: Outcome, words: Words): Difference[] {
	const { t } = words;
	const found: Difference[] = [];
	if (tablet.verdict !== server.verdict) {
		found.push({
			name: t('differences.verdict'),
			tablet: t(`verdict.${tablet.verdict}`),
			server: t(`verdict.${server.verdict}`)
		});
	}
	for (const [field, key, unit] of FIGURES) {
		if (same(tablet[field], server[field])) continue;
		const shown = (value: number | null) => figureWords(value, unit, words);
		found.push({ name: t(key), tablet: shown(tablet[field]), server: shown(server[field]) });
	}
	if (tablet.core !== server.core) {
		found.push({ name: t('differences.core'), tablet: tablet.core, server: server.core });
	}
	return found;
}

function same(a: number | null, b: number | null): boolean {
	if (a === null || b === null) return a === b;
	return Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b));
}

function figureWords(value: number | null, unit: string, { t, language }: Words): string {
	return value === null ? t('differences.none') : `${figure(value, 10, language)} ${unit}`.trim();
}

/** The note beside the verdict where both came to the same, with the margin that the verdict shows. */
export function agreementNote(
	tablet: Outcome,
	server: Outcome,
	words: Words
): { lead: string; rest: string } {
	const { t, language } = words;
	const lead = t('differences.agree');
	if (tablet.core !== server.core) {
		return { lead, rest: t('differences.agree-cores', { tablet: tablet.core, server: server.core }) };
	}
	const { core } = server;
	const [tablets, servers] = [decidingMargin(tablet), decidingMargin(server)];
	if (tablets === null || servers === null) {
		return { lead, rest: t('differences.agree-verdict', { core }) };
	}
	const shown = (value: number) => fixed(Math.floor(value * 1000 + 1e-9) / 1000, 3, language);
	return {
		lead,
		rest: t('differences.agree-figures', {
			tablet: shown(tablets),
			server: shown(servers),
			core
		})
	};
}
