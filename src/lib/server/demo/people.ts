/** The demonstration's people: invented names, addresses at reserved `.example` domains. */
import type { DemoPerson } from './scenario';

export function person(
	email: string,
	name: string,
	password: string,
	locale: DemoPerson['locale'] = 'en'
): DemoPerson {
	return { email, name, password, locale };
}

/** Plans at one plant and works as a millwright at the other. */
export const HOLLIS = person('hollis@ashgrove.example', 'Hollis', 'two-plants-one-toolbox');
