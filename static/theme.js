// Before the first paint: the theme and language this device was left in. A file of its own, since the
// content security policy allows no inline script.
try {
	const theme = localStorage.getItem('theme');
	if (theme === 'night') document.documentElement.dataset.theme = 'night';
	const language = localStorage.getItem('language');
	if (language) document.documentElement.lang = language;
} catch {
	// Storage may be refused; day and English then stand.
}
