/** Where the chosen light is kept on this device. */
export const LIGHT_KEY = "light";

/**
 * Runs before the first paint, so that a page opened at night never flashes
 * white. It is inline and never changes between requests: the content security
 * policy names it by its hash, on static and on dynamic pages alike.
 */
export const LIGHT_SCRIPT = `try{if(localStorage.getItem("${LIGHT_KEY}")==="night")document.documentElement.dataset.light="night"}catch{}`;
