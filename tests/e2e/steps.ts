/** A whole check by touch only, from the cautions to the result. */
import type { Page } from '@playwright/test';
import { tapKeys } from './fixtures';

export interface Check {
	teeth: string;
	outsideDiameter: string;
	faceWidth: string;
	pitch: RegExp;
	form: RegExp;
	power: string;
	speed: string;
	/** The plant's factor by its figure. */
	service: RegExp;
	finish: string;
	material: RegExp;
}

export async function doCheck(page: Page, check: Check): Promise<void> {
	const keep = page.getByRole('button', { name: 'Keep this reading' });
	const reading = async (title: string, keys: string) => {
		await page.getByRole('heading', { level: 1, name: title }).waitFor();
		await tapKeys(page, keys);
		await keep.tap();
	};
	await page.getByRole('link', { name: 'Next: Look' }).tap();
	await page.getByRole('link', { name: 'Next: Measure' }).tap();
	await reading('Teeth', check.teeth);
	await reading('Outside diameter', check.outsideDiameter);
	await reading('Face width', check.faceWidth);
	await page.getByRole('radio', { name: check.pitch }).tap();
	await page.getByRole('radio', { name: check.form }).tap();
	await page.getByRole('link', { name: 'Next: Drive' }).tap();
	await page.getByRole('radio', { name: 'nameplate' }).tap();
	await reading('Power', check.power);
	await reading('Speed', check.speed);
	await page.getByRole('radio', { name: check.service }).tap();
	await keep.tap();
	await page.getByRole('radio', { name: check.finish }).tap();
	await page.getByRole('radio', { name: check.material }).tap();
	await page.getByRole('link', { name: 'Next: Result' }).tap();
}
