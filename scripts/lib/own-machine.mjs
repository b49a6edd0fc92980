const LOOPBACK = ["localhost", "127.0.0.1", "::1", "[::1]"];

/**
 * Is the site for whoever sits at this machine, and nobody else? Then the mail it sent may be shown on a page: every link
 * that signs somebody in is there.
 * @param {string} host the address listened on
 * @param {string} url the address people open: with a proxy in front it is another machine's
 */
export const isForThisMachine = (host, url) => LOOPBACK.includes(host) && LOOPBACK.includes(new URL(url).hostname);
