// The tablet works without a server: everything below is rendered in the browser from what it keeps itself.
export const ssr = false;
