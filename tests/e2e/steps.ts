/** A whole check by touch only, from the cautions to the result. */
import type { Page } from '@playwright/test';
import { tapKeys } from './fixtures';

export interface Check {
	teeth: string;
	outsideDiameter: string;
	faceWidth: string;
	/** Among the candidates. */
	gear: RegExp;
	power: string;
	speed: string;
	/** The plant's factor by its figure. */
	service: RegExp;
	finish: string;
	material: RegExp;
}

/** One reading on its own screen, from the keypad. */
export async function takeReading(page: Page, title: string, keys: string): Promise<void> {
	await page.getByRole('heading', { level: 1, name: title, exact: true }).waitFor();
	await tapKeys(page, keys);
	await page.getByRole('button', { name: 'Keep this reading' }).tap();
}

/** What is asked of every gear; a count that the record does not confirm is counted again. */
export async function measure(
	page: Page,
	{ teeth, outsideDiameter, faceWidth }: Pick<Check, 'teeth' | 'outsideDiameter' | 'faceWidth'>
): Promise<void> {
	await takeReading(page, 'Teeth', teeth);
	const again = page.getByRole('heading', { level: 1, name: 'Teeth, counted again' });
	await again.or(page.getByRole('heading', { level: 1, name: 'Outside diameter' })).waitFor();
	if (await again.isVisible()) await takeReading(page, 'Teeth, counted again', teeth);
	await takeReading(page, 'Outside diameter', outsideDiameter);
	await takeReading(page, 'Face width', faceWidth);
}

export async function doCheck(page: Page, check: Check): Promise<void> {
	const keep = page.getByRole('button', { name: 'Keep this reading' });
	const reading = (title: string, keys: string) => takeReading(page, title, keys);
	await page.getByRole('link', { name: 'Next: Look' }).tap();
	await page.getByRole('link', { name: 'Next: Measure' }).tap();
	await measure(page, check);
	await page.getByRole('button', { name: check.gear }).tap();
	await page.getByRole('button', { name: /^Go on with/ }).tap();
	await page.getByRole('radio', { name: 'nameplate' }).tap();
	await reading('Power', check.power);
	await reading('Speed here', check.speed);
	await page.getByRole('radio', { name: check.service }).tap();
	await keep.tap();
	await page.getByRole('radio', { name: check.finish }).tap();
	await page.getByRole('radio', { name: check.material }).tap();
	await page.getByRole('link', { name: 'Next: Result' }).tap();
}
