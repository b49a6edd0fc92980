import "server-only";

const BROWSERS = [
  [/\bEdg\//, "Edge"],
  [/\bOPR\//, "Opera"],
  [/\bFirefox\/|\bFxiOS\//, "Firefox"],
  [/\bChrome\/|\bCriOS\//, "Chrome"],
  [/\bSafari\//, "Safari"],
] as const;
const SYSTEMS = [
  [/\bAndroid\b/, "Android"],
  [/\biPhone\b/, "iPhone"],
  [/\biPad\b/, "iPad"],
  [/\bWindows\b/, "Windows"],
  [/\bMac OS X\b/, "Mac"],
  [/\bLinux\b/, "Linux"],
] as const;

/** "Chrome on Android": enough for people to know their own devices by. */
export function deviceName(headers: Headers): string {
  const agent = headers.get("user-agent") ?? "";
  const named = (list: readonly (readonly [RegExp, string])[]) => list.find(([pattern]) => pattern.test(agent))?.[1];
  const browser = named(BROWSERS) ?? "A browser";
  const system = named(SYSTEMS);
  return system ? `${browser} on ${system}` : browser;
}
