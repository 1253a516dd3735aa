/** Figures of an outcome that no margin tells: both form factors, the mesh, the flanks. Only those that it has. */
import type { Outcome } from '$lib/gear/contract';
import { fromSI } from '$lib/gear/quantity';
import type { Words } from '$lib/i18n/context.svelte';
import { figure, fixed } from '$lib/i18n/format';

export interface FigureRow {
	label: string;
	value: string;
}

export function figureRows(outcome: Outcome, metric: boolean, words: Words): FigureRow[] {
	return [
		...toothRows(outcome, words),
		...wearRows(outcome, metric, words),
		...meshRows(outcome, metric, words)
	];
}

function toothRows(
	{ formFactorHandbook, formFactorGeometry, formFactorSource, stressConcentration }: Outcome,
	{ t, language }: Words
): FigureRow[] {
	const counted = (source: Outcome['formFactorSource'], value: number) =>
		source === formFactorSource
			? t('figures.counts', { value: fixed(value, 3, language) })
			: fixed(value, 3, language);
	return [
		...row(t('figures.handbook'), formFactorHandbook, (value) => counted('handbook', value)),
		...row(t('figures.geometry'), formFactorGeometry, (value) => counted('geometry', value)),
		...row(t('figures.concentration'), stressConcentration, (value) => fixed(value, 2, language))
	];
}

function wearRows({ wear }: Outcome, metric: boolean, { t, language }: Words): FigureRow[] {
	if (!wear) return [];
	const [stress, force] = metric ? (['MPa', 'N'] as const) : (['psi', 'lbf'] as const);
	return [
		...row(
			t('figures.contact'),
			wear.contactStress,
			(value) => `${figure(fromSI(value, stress), 4, language)} ${stress}`
		),
		...row(
			t('figures.allowable-contact'),
			wear.allowableContact,
			(value) => `${figure(fromSI(value, stress), 4, language)} ${stress}`
		),
		...row(
			t('figures.wear-load'),
			wear.wearLoad,
			(value) => `${figure(fromSI(value, force), 4, language)} ${force}`
		)
	];
}

function meshRows({ mesh }: Outcome, metric: boolean, { t, language }: Words): FigureRow[] {
	if (!mesh) return [];
	const unit = metric ? 'mm' : 'in';
	const length = (value: number) => `${fixed(fromSI(value, unit), metric ? 2 : 3, language)} ${unit}`;
	const yesNo = (value: boolean) => t(value ? 'figures.yes' : 'figures.no');
	return [
		...row(t('figures.ratio'), mesh.ratio, (value) => figure(value, 4, language)),
		...row(t('figures.centre'), mesh.standardCentreDistance, length),
		...row(t('figures.angle'), mesh.operatingPressureAngle, (value) => `${fixed(value, 2, language)}°`),
		...row(t('figures.contact-ratio'), mesh.contactRatio + mesh.overlapRatio, (value) =>
			fixed(value, 2, language)
		),
		...row(t('figures.contact-ratio-undercut'), shortened(mesh), (value) => fixed(value, 2, language)),
		...row(t('figures.backlash'), mesh.normalBacklash, length),
		{ label: t('figures.hunting'), value: yesNo(mesh.huntingTooth) },
		{ label: t('figures.undercut'), value: yesNo(mesh.undercut.gear || mesh.undercut.mate) },
		{ label: t('figures.interference'), value: yesNo(mesh.interference) }
	];
}

/** Contact ratio where the roots take something from it: told beside the published one, and judged. */
function shortened({
	contactRatio,
	contactRatioUndercut,
	overlapRatio
}: NonNullable<Outcome['mesh']>): number | null {
	if (contactRatioUndercut === null || contactRatioUndercut >= contactRatio) return null;
	return contactRatioUndercut + overlapRatio;
}

function row(label: string, value: number | null | undefined, shown: (value: number) => string): FigureRow[] {
	return value === null || value === undefined ? [] : [{ label, value: shown(value) }];
}
