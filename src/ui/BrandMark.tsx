/** Two leaves above the line, three roots below: the shop's mark beside the farm's name. */
export function BrandMark({ className = "size-9" }: { className?: string | undefined }) {
  return (
    <svg viewBox="4 4 56 60" className={`shrink-0 ${className}`} aria-hidden="true" fill="none" strokeLinecap="round">
      <path d="M32 33C15 33 10 20 12 8c13 0 22 8 20 25Z" className="fill-leaf" />
      <path d="M32 33c0-15 9-21 21-21 0 13-8 21-21 21Z" className="fill-radicchio" />
      <path d="M6 35h52" className="stroke-water-deep" strokeWidth="4" />
      <path
        d="M32 37c0 10-7 11-9 20M32 37c0 10 1 12 0 22M32 37c0 10 7 11 9 20"
        className="stroke-water-deep"
        strokeWidth="3"
      />
    </svg>
  );
}
