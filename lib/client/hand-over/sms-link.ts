/**
 * A link that opens the phone's messages with the text in it, and the number where there is one (RFC 5724, with the
 * "body" that phones understand). Signs that are written into numbers for the eye are left out.
 */
export function smsLink(number: string, text: string): string {
  const dialled = number.replace(/(?!^\+)[^0-9]/g, "");
  return `sms:${dialled}?&body=${encodeURIComponent(text)}`;
}
