/** "Seconds to start: 4 s"; a title that is a question needs no colon: "Is the miss regular? No". */
export const saidTogether = (title: string, says: string): string => (title.endsWith("?") ? `${title} ${says}` : `${title}: ${says}`);
