/** What the header says about keeping and sending, in two lines; the words are those of the sync rules. */
import type { Words } from '$lib/i18n/context.svelte';
import { ago, clock, moment } from '$lib/i18n/format';
import type { SyncStatus } from '$lib/tablet/start';

export interface StatusWords {
	first: string;
	second: string;
	/** Asks for a person: signed out, blocked, an update, a record that needs attention. */
	urgent: boolean;
}

export function statusWords(status: SyncStatus, { t, language }: Words, now: number): StatusWords {
	const contact = status.contactAt
		? t('sync.contact', { time: moment(status.contactAt, language, new Date(now)) })
		: t('sync.contact-never');
	const { sending } = status;
	if (status.attention > 0 && sending.state === 'nothing-waits') {
		return {
			first: t('sync.attention', { n: status.attention }),
			second: t('sync.nothing-lost'),
			urgent: true
		};
	}
	switch (sending.state) {
		case 'nothing-waits':
			return { first: t('sync.nothing-waits'), second: clockWords(status, t) ?? contact, urgent: false };
		case 'waiting': {
			const age = sending.oldestSince ? now - Date.parse(sending.oldestSince) : 0;
			return {
				first: t('sync.kept-here'),
				second:
					age > 3_600_000
						? t('sync.waiting-oldest', { n: sending.count, age: ago(age, language) })
						: t('sync.waiting', { n: sending.count }),
				urgent: false
			};
		}
		case 'sending':
			return { first: t('sync.sending', { at: sending.at, of: sending.of }), second: contact, urgent: false };
		case 'signed-out':
			return {
				first: t('sync.signed-out'),
				second: sending.count > 0 ? t('sync.kept-count', { n: sending.count }) : contact,
				urgent: sending.count > 0
			};
		case 'blocked':
			return {
				first: t(sending.code === 'tablet-blocked' ? 'sync.blocked' : 'sync.not-allowed'),
				second: t('sync.kept-count', { n: sending.count }),
				urgent: true
			};
		case 'update':
			return { first: t('sync.update'), second: t('sync.kept-count', { n: sending.count }), urgent: true };
	}
}

function clockWords(status: SyncStatus, t: Words['t']): string | null {
	if (status.clock.state !== 'off') return null;
	const hours = Math.abs(status.clock.offsetMs) / 3_600_000;
	return hours >= 1
		? t('sync.clock-hours', { n: Math.round(hours) })
		: t('sync.clock-minutes', { n: Math.round(hours * 60) });
}

/** The state of one record, for lists and the last step. */
export function recordWords(
	record: { status: { state: string; at?: string; text?: string; code?: string } },
	{ t, language }: Words
): string {
	const { status } = record;
	if (status.state === 'received' && status.at) {
		return t('sync.received', { time: clock(status.at, language) });
	}
	if (status.state === 'attention') return t('sync.record-attention', { reason: status.text ?? '' });
	return t('sync.record-waiting');
}
