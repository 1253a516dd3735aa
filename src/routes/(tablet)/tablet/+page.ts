// The shell that the service worker serves at every tablet address while there is no network.
export const prerender = true;
