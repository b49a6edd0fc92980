/** Stands under every screen that sends someone to an engine. */
export function Defers() {
  return (
    <p className="mt-6 text-sm text-ink-2">
      The engine maker&rsquo;s manual, local rules and a licensed technician stand above anything said here. If in doubt, stop and ask one.
    </p>
  );
}
