import { ButtonLink } from "./ButtonLink.tsx";

type Props = {
  page: number;
  pages: number;
  /** The address of a page, from 1. */ linkTo: (page: number) => string;
  label?: string | undefined;
};

/** Back and on through a long list, with where one is in words. */
export function Pagination({ page, pages, linkTo, label = "Pages" }: Props) {
  if (pages <= 1) return null;
  return (
    <nav aria-label={label} className="flex flex-wrap items-center justify-center gap-4 py-4">
      {page > 1 && (
        <ButtonLink to={linkTo(page - 1)} rel="prev" variant="quiet" size="small">
          Back
        </ButtonLink>
      )}
      <span className="num">
        Page {page} of {pages}
      </span>
      {page < pages && (
        <ButtonLink to={linkTo(page + 1)} rel="next" variant="quiet" size="small">
          Next
        </ButtonLink>
      )}
    </nav>
  );
}
