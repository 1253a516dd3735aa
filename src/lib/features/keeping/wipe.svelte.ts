/** Whether the screen is locked for wiping: set from the header of any screen, shown by the group's layout. */
import { getContext, setContext } from 'svelte';

const KEY = Symbol('wipe');

class Wipe {
	locked = $state(false);
}

export function provideWipe(): Wipe {
	return setContext(KEY, new Wipe());
}

export function useWipe(): Wipe {
	return getContext<Wipe>(KEY);
}
