import type { ReactNode } from "react";

type Props = {
  title: ReactNode;
  children?: ReactNode;
  /** What to do next: usually a ButtonLink. */ action?: ReactNode;
};

/** The face of a list with nothing in it: bare roots on a waterline, what that means, what to do. */
export function EmptyState({ title, children, action }: Props) {
  return (
    <div className="rounded-card bg-float px-5 py-8 text-center">
      <svg
        viewBox="0 0 120 64"
        className="mx-auto mb-3 h-16 text-water-deep"
        aria-hidden="true"
        fill="none"
        stroke="currentColor"
        strokeLinecap="round"
      >
        <path d="M60 22c-10-1-14-8-13-16 8 1 13 7 13 16Zm0 0c0-9 5-14 12-15 1 8-4 14-12 15Z" strokeWidth="2" />
        <path d="M10 24h100" strokeWidth="3" />
        <path d="M60 26c0 12-8 12-10 26M60 26c0 13 1 18 0 34M60 26c0 12 8 12 10 26" strokeWidth="2" />
      </svg>
      <h2 className="text-title">{title}</h2>
      {children && <div className="mx-auto mt-2 max-w-text text-ink-2">{children}</div>}
      {action && <div className="mt-5">{action}</div>}
    </div>
  );
}
