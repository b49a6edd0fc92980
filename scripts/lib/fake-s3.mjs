// A stand-in for S3 in tests: PUT, GET, HEAD and DELETE of objects, path-style, in memory, on loopback.
import { createHash } from "node:crypto";
import http from "node:http";

/** @returns {Promise<{ url: string, buckets: Map<string, Map<string, { body: Buffer, type: string }>>, stop: () => Promise<void> }>} */
export function startFakeS3({ port = 0 } = {}) {
  const buckets = new Map();
  const server = http.createServer((request, response) => {
    const url = new URL(request.url, "http://x");
    const [, bucket, ...rest] = decodeURIComponent(url.pathname).split("/");
    const key = rest.join("/");
    const fail = (status, code) => {
      const body = `<?xml version="1.0"?><Error><Code>${code}</Code><Message>${code}</Message></Error>`;
      response.writeHead(status, { "content-type": "application/xml" }).end(request.method === "HEAD" ? undefined : body);
    };
    const chunks = [];
    request.on("data", (chunk) => chunks.push(chunk));
    request.on("end", () => {
      // Signed by whatever key, but signed: a test that sends no credentials must fail.
      if (!request.headers.authorization?.startsWith("AWS4-HMAC-SHA256")) return fail(403, "AccessDenied");
      if (!key && request.method === "PUT") {
        if (!buckets.has(bucket)) buckets.set(bucket, new Map());
        return response.writeHead(200).end();
      }
      const objects = buckets.get(bucket);
      if (!objects) return fail(404, "NoSuchBucket");
      if (request.method === "PUT") {
        let body = Buffer.concat(chunks);
        if (String(request.headers["content-encoding"]).includes("aws-chunked")) body = unchunk(body);
        objects.set(key, { body, type: request.headers["content-type"] ?? "application/octet-stream" });
        return response.writeHead(200, { etag: tagOf(body) }).end();
      }
      if (request.method === "DELETE") {
        objects.delete(key);
        return response.writeHead(204).end();
      }
      const found = objects.get(key);
      if (!found) return fail(404, "NoSuchKey");
      response.writeHead(200, { "content-type": found.type, "content-length": found.body.length, etag: tagOf(found.body) });
      response.end(request.method === "HEAD" ? undefined : found.body);
    });
  });
  const stop = () =>
    new Promise((resolve) => {
      server.close(resolve);
      server.closeAllConnections();
    });
  return new Promise((resolve) =>
    server.listen(port, "127.0.0.1", () => resolve({ url: `http://127.0.0.1:${server.address().port}`, buckets, stop })),
  );
}

const tagOf = (body) => `"${createHash("md5").update(body).digest("hex")}"`;

/** The aws-chunked framing: hex size[;signature] CRLF data CRLF … 0 CRLF trailers. */
function unchunk(framed) {
  const out = [];
  for (let at = 0; ;) {
    const end = framed.indexOf("\r\n", at);
    const size = parseInt(framed.toString("latin1", at, end), 16);
    if (!size) return Buffer.concat(out);
    out.push(framed.subarray(end + 2, end + 2 + size));
    at = end + 2 + size + 2;
  }
}
