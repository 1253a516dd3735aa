/** Day or night, switched by a button only and remembered on this device (static/theme.js applies it at first paint). */

class Theme {
	night = $state(typeof document !== 'undefined' && document.documentElement.dataset.theme === 'night');

	toggle(): void {
		this.night = !this.night;
		if (this.night) document.documentElement.dataset.theme = 'night';
		else delete document.documentElement.dataset.theme;
		localStorage.setItem('theme', this.night ? 'night' : 'day');
	}
}

export const theme = new Theme();
