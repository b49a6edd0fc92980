/**
 * A number as people type it: comma or point for the decimals, spaces (or the
 * other sign) between thousands, a minus of any kind. Rule [U3].
 *
 * @returns null when it is not a number; "1,234" is one and a bit, never a
 *   thousand: on a gauge the small reading is the likelier one, and the screen
 *   shows what was understood.
 */
export function readNumber(typed: string): number | null {
  const text = typed
    .trim()
    .replace(/[\u2212\u2013]/g, "-")
    .replace(/(?<=\d)[\s\u00a0\u202f'\u2019](?=\d{3}(\D|$))/g, "");
  if (/^[+-]?\d+([.,]\d*)?$/.test(text) || /^[+-]?[.,]\d+$/.test(text)) return Number(text.replace(",", "."));
  if (/^[+-]?\d{1,3}(,\d{3})+\.\d+$/.test(text)) return Number(text.replaceAll(",", ""));
  if (/^[+-]?\d{1,3}(\.\d{3})+,\d+$/.test(text)) return Number(text.replaceAll(".", "").replace(",", "."));
  return null;
}
