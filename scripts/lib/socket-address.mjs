// Preloaded into the web server (serve.mjs, dev.mjs): with no proxy in front, where a request comes from is what its
// socket says. X-Forwarded-For is then the caller's own word and is replaced before anything reads it. Behind proxies,
// TRUSTED_PROXIES says how many, and what they wrote stays (lib/server/auth/client-address.ts).
import http from "node:http";

const emit = http.Server.prototype.emit;

http.Server.prototype.emit = function (event, ...rest) {
  const [request] = rest;
  if ((event === "request" || event === "upgrade") && !(Number(process.env.TRUSTED_PROXIES ?? 0) > 0)) {
    const address = request.socket.remoteAddress;
    if (address) request.headers["x-forwarded-for"] = address;
    else delete request.headers["x-forwarded-for"];
  }
  return emit.call(this, event, ...rest);
};
