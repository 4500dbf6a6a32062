import { classes } from "./classes.ts";

type Props = {
  /** What is coming: "Loading this week". Read aloud, not shown. */ label: string;
  shape?: "card" | "rows" | "text" | undefined;
  count?: number | undefined;
};

const bar = "block rounded-card bg-water animate-pulse";

/** The face of a list on its way, in the shape it will have. */
export function Skeleton({ label, shape = "rows", count = 4 }: Props) {
  const items = Array.from({ length: count }, (_, index) => index);
  return (
    <div role="status">
      <span className="sr-only">{label}…</span>
      {shape === "card" && (
        <div className="grid grid-cols-[repeat(auto-fill,minmax(15rem,1fr))] gap-5">
          {items.map((item) => (
            <span key={item} className={classes(bar, "h-96")} />
          ))}
        </div>
      )}
      {shape === "rows" && (
        <div className="grid gap-2.5">
          {items.map((item) => (
            <span key={item} className={classes(bar, "h-14")} />
          ))}
        </div>
      )}
      {shape === "text" && (
        <div className="grid gap-3">
          {items.map((item) => (
            <span key={item} className={classes(bar, "h-4", item === count - 1 && "w-3/5")} />
          ))}
        </div>
      )}
    </div>
  );
}
