import CircleAlert from "lucide-react/icons/circle-alert";
import Clock from "lucide-react/icons/clock";
import Info from "lucide-react/icons/info";
import type { ReactNode } from "react";
import { classes } from "./classes.ts";

export type BannerTone = "info" | "late" | "alarm";

const tones: Record<BannerTone, { style: string; Icon: typeof Info }> = {
  info: { style: "bg-water text-ink", Icon: Info },
  late: { style: "bg-awning text-awning-ink", Icon: Clock },
  alarm: { style: "bg-alarm text-on-primary", Icon: CircleAlert },
};

// On a coloured ground buttons and links take the ground's own ink.
const actionStyle =
  "[&_a]:border-current [&_a]:text-current [&_a:hover]:bg-transparent [&_a:hover]:underline [&_button]:border-current [&_button]:text-current [&_button:hover]:bg-transparent [&_button:hover]:underline";

type Props = {
  tone?: BannerTone | undefined;
  title?: ReactNode;
  children?: ReactNode;
  /** Buttons or links on the right. */ action?: ReactNode;
};

/** A message across a page: what happened and what to do. An alarm is read out at once. */
export function Banner({ tone = "info", title, children, action }: Props) {
  const { style, Icon } = tones[tone];
  return (
    <div
      role={tone === "alarm" ? "alert" : "status"}
      className={classes("flex flex-wrap items-start gap-x-4 gap-y-2 rounded-card px-4 py-3", style)}
    >
      <Icon aria-hidden="true" className="mt-0.5 shrink-0" />
      <div className="min-w-0 flex-1 basis-44">
        {title && <p className="font-semibold">{title}</p>}
        {children}
      </div>
      {action && <div className={actionStyle}>{action}</div>}
    </div>
  );
}
