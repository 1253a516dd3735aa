// Kept on the device by the service worker, so that a page of the office says in words that there is no network.
export const prerender = true;
export const csr = false;
