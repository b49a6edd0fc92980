export default function Loading() {
  return (
    <p role="status" className="text-ink-2">
      One moment…
    </p>
  );
}
