import type { ReactNode } from "react";

type Props = {
  /** Above the line. */ leaf: ReactNode;
  /** Below it, in water. */ roots: ReactNode;
  className?: string | undefined;
};

/** The one line of a card: leaf above, roots and facts below, in water. */
export function LeafAndRoots({ leaf, roots, className = "" }: Props) {
  return (
    <div className={`flex flex-col overflow-hidden rounded-card bg-float ${className}`}>
      {leaf}
      <div className="grow border-t-3 border-water-deep bg-water">{roots}</div>
    </div>
  );
}

/** The waterline alone, for pages that stand on it; decoration. */
export function Waterline({ className = "" }: { className?: string | undefined }) {
  return <div className={`h-[3px] bg-water-deep ${className}`} />;
}
