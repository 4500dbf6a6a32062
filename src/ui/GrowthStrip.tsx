import { classes } from "./classes.ts";

/** A stage and where it ends on the way from 0 to 1. */
export type GrowthStage = { name: string; until: number };
/** A batch on its way: `at` from 0 to 1, sized by plants, coloured by leaf. */
export type GrowthDot = { key: string | number; at: number; plants: number; leaf: "green" | "red"; label: string };

const stageFills = ["fill-water/40", "fill-water/70", "fill-water", "fill-awning-soft"];
const mostPlants = 240;

type Props = { label: string; stages: GrowthStage[]; dots: GrowthDot[]; className?: string | undefined };

/** Every batch of one variety as a dot on its way through the stages; the same is said in words for those who cannot see it. */
export function GrowthStrip({ label, stages, dots, className }: Props) {
  return (
    <div className={className}>
      <svg width="100%" height="28" className="block rounded-full" aria-hidden="true">
        {stages.map(({ name, until }, index) => {
          const from = stages[index - 1]?.until ?? 0;
          return (
            <rect
              key={name}
              x={percent(from)}
              width={percent(until - from)}
              height="28"
              className={stageFills[Math.min(index, 3)]}
            />
          );
        })}
        {dots.map(({ key, at, plants, leaf }) => (
          <circle
            key={key}
            cx={percent(Math.min(0.975, Math.max(0.025, at)))}
            cy="14"
            r={(5 + 6 * Math.sqrt(Math.min(1, plants / mostPlants))).toFixed(1)}
            className={classes("stroke-float stroke-3", leaf === "red" ? "fill-radicchio" : "fill-leaf")}
          />
        ))}
      </svg>
      <ul className="sr-only" aria-label={label}>
        {dots.map(({ key, label: words }) => (
          <li key={key}>{words}</li>
        ))}
      </ul>
    </div>
  );
}

/** The names of the stages, each above where it begins. */
export function GrowthStageNames({ stages, className }: { stages: GrowthStage[]; className?: string | undefined }) {
  return (
    <svg width="100%" height="24" className={classes("block text-small", className)} aria-hidden="true">
      {stages.map(({ name }, index) => (
        <text key={name} x={percent(stages[index - 1]?.until ?? 0)} y="17" className="fill-ink-2">
          {name}
        </text>
      ))}
    </svg>
  );
}

const percent = (share: number) => `${Math.round(share * 1000) / 10}%`;
