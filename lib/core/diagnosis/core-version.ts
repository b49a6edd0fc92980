/**
 * Counts up whenever the same tree and log would be read differently. The
 * `begun` event keeps the number, so that a later reading can say so.
 */
export const CORE_VERSION = 3;
