/** The first stop of the Tab key on every page: past the head, to what the page is for. */
export function SkipLink({ to = "main" }: { to?: string | undefined }) {
  return (
    <a
      href={`#${to}`}
      className="sr-only focus:not-sr-only focus:fixed focus:top-3 focus:left-3 focus:z-50 focus:rounded-full focus:bg-water-deep focus:px-5 focus:py-3 focus:font-semibold focus:text-on-primary"
    >
      Skip to the content
    </a>
  );
}
