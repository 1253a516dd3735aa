/** The languages of the interface, and how one is chosen before a person has said anything. */
export const LANGUAGES = ['en', 'es'] as const;
export type Language = (typeof LANGUAGES)[number];

export function isLanguage(value: unknown): value is Language {
	return value === 'en' || value === 'es';
}

/** The first known language of an Accept-Language header or a browser's list; English where there is none. */
export function languageFromHeader(header: string | null): Language {
	for (const part of (header ?? '').split(',')) {
		const code = part.trim().slice(0, 2).toLowerCase();
		if (isLanguage(code)) return code;
	}
	return 'en';
}
