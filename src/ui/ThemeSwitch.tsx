import Moon from "lucide-react/icons/moon";
import SunMedium from "lucide-react/icons/sun-medium";
import SunMoon from "lucide-react/icons/sun-moon";
import { Segments } from "./Segments.tsx";
import type { Theme } from "./useTheme.ts";

type Props = { value: Theme; onChange: (theme: Theme) => void; size?: "regular" | "stall" | undefined };

const options = [
  { value: "auto" as const, label: <Choice Icon={SunMoon} words="Auto" /> },
  { value: "sun" as const, label: <Choice Icon={SunMedium} words="Sun" /> },
  { value: "night" as const, label: <Choice Icon={Moon} words="Night" /> },
];

/** Sun, night, or as the phone is set: one tap apart. */
export function ThemeSwitch({ value, onChange, size }: Props) {
  return <Segments label="Theme" options={options} value={value} onChange={onChange} size={size} />;
}

function Choice({ Icon, words }: { Icon: typeof Moon; words: string }) {
  return (
    <>
      <Icon aria-hidden="true" className="size-5" />
      {words}
    </>
  );
}
