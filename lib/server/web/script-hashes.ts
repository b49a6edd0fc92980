import "server-only";

/**
 * The hashes of the inline scripts in pages that were made when Gudgeon was built: the start command gathers them after
 * the build and hands them on in SCRIPT_HASHES, parted by blanks. What is no hash is left out.
 */
export function builtScriptHashes(list = process.env.SCRIPT_HASHES ?? ""): string[] {
  return list
    .split(/\s+/)
    .map((hash) => hash.replace(/^'|'$/g, ""))
    .filter((hash) => /^sha256-[A-Za-z0-9+/]{43}=$/.test(hash))
    .map((hash) => `'${hash}'`);
}
