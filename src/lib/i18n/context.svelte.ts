/**
 * The language of a page as a Svelte context: set once by the layout of each group (door, tablet, office),
 * read by every component below. Never a module's variable, since the server renders for many people at once.
 */
import { getContext, setContext } from 'svelte';
import { translator, type MessageKey, type Values } from './catalogue';
import { isLanguage, languageFromHeader, type Language } from './language';

const KEY = Symbol('language');

export class Words {
	language: Language = $state('en');
	#translate = $derived(translator(this.language));

	constructor(language: Language) {
		this.language = language;
	}

	/** The words for a key in the language of the page. */
	t = (key: MessageKey, values?: Values): string => this.#translate(key, values);

	/** Switches the page at once and remembers it on this device and for the server's pages. */
	switchTo(language: Language): void {
		this.language = language;
		document.documentElement.lang = language;
		document.cookie = `language=${language}; path=/; max-age=31536000; samesite=lax`;
		localStorage.setItem('language', language);
	}
}

/** For pages that no server renders: the language this device was left in, else the browser's. */
export function deviceLanguage(): Language {
	const left = localStorage.getItem('language');
	const language = isLanguage(left) ? left : languageFromHeader(navigator.languages.join(','));
	document.documentElement.lang = language;
	return language;
}

export function provideWords(language: Language): Words {
	return setContext(KEY, new Words(language));
}

export function useWords(): Words {
	return getContext<Words>(KEY);
}
