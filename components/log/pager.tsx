import { LinkButton } from "@/components/ui/link-button";

type Props = {
  path: string;
  /** What the list is narrowed to; kept from page to page. */
  query?: Readonly<Record<string, string>>;
  /** Is this a page after the first? */ isLater: boolean;
  next: string | null;
};

/** From page to page of a list that grows: by key, so that a new line moves nothing. */
export function Pager({ path, query = {}, isLater, next }: Props) {
  if (!isLater && next === null) return null;
  const to = (more: Record<string, string>) => {
    const search = new URLSearchParams({ ...query, ...more }).toString();
    return search ? `${path}?${search}` : path;
  };
  return (
    <nav aria-label="Pages" className="no-print mt-4 flex flex-wrap gap-3">
      {isLater && (
        <LinkButton prefetch={false} href={to({})}>
          Newest
        </LinkButton>
      )}
      {next !== null && (
        <LinkButton prefetch={false} href={to({ after: next })}>
          Older
        </LinkButton>
      )}
    </nav>
  );
}
