/**
 * The one message catalogue. Every key holds both languages side by side, so neither can be forgotten;
 * `{name}` is replaced by a value. A key ending in `#one` stands for the singular of the key before the mark.
 */
import type { Language } from './language';
import { checkPage } from './messages/check-page';
import { common } from './messages/common';
import { door } from './messages/door';
import { gear } from './messages/gear';
import { identify } from './messages/identify';
import { materials } from './messages/materials';
import { office } from './messages/office';
import { reasons } from './messages/reasons';
import { rules } from './messages/rules';
import { strip } from './messages/strip';
import { sync } from './messages/sync';
import { tablet } from './messages/tablet';
import { verdict } from './messages/verdict';
import { working } from './messages/working';

const catalogue = {
	...checkPage,
	...common,
	...door,
	...gear,
	...identify,
	...materials,
	...office,
	...reasons,
	...rules,
	...strip,
	...sync,
	...tablet,
	...verdict,
	...working
};

export type MessageKey = keyof typeof catalogue;
export type Values = Record<string, string | number>;
export type Translate = (key: MessageKey, values?: Values) => string;

const INDEX: Record<Language, 0 | 1> = { en: 0, es: 1 };

export function translator(language: Language): Translate {
	return (key, values) => {
		const single = `${key}#one`;
		const chosen = values?.n === 1 && isMessage(single) ? single : key;
		return fill(catalogue[chosen][INDEX[language]], values);
	};
}

/** For keys that are put together from codes: what is unknown shows its code rather than nothing. */
export function isMessage(key: string): key is MessageKey {
	return Object.hasOwn(catalogue, key);
}

function fill(text: string, values: Values = {}): string {
	return text.replace(/\{(\w+)\}/g, (place, name: string) => String(values[name] ?? place));
}
