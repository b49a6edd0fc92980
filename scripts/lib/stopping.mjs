// Orderly ends: last started, first stopped; nothing left running, whatever ended us.

/**
 * Collects what has to be stopped: `add(stop)`. `end(code, why, last)` stops it all, runs `last` and exits; signals,
 * and npm itself being killed, end it too.
 */
export function stopping() {
  const stops = [];
  let ending;
  const end = (code, why, last) => {
    ending ??= (async () => {
      if (why) console.log(why);
      for (const stop of stops.reverse()) await stop().catch((e) => console.error(e));
      last?.();
      process.exit(code);
    })();
    return ending;
  };
  for (const [signal, code] of [
    ["SIGINT", 130],
    ["SIGTERM", 143],
    ["SIGHUP", 129],
  ]) {
    process.on(signal, () => end(code, `${signal}: stopping`));
  }
  // npm killed hard: nobody is left to stop us, so we go too.
  const parent = process.ppid;
  if (process.env.npm_lifecycle_event) setInterval(() => process.ppid !== parent && end(1, "npm is gone: stopping"), 1000).unref();
  return { add: (stop) => stops.push(stop), end };
}
