import encodeQR from "qr";

type Props = {
  text: string;
  /** What scanning it gives: "Pickup code K7M". */ label: string;
  className?: string | undefined;
};

/** A QR code as one path, dark on light in every theme so that any camera reads it. */
export function QrCode({ text, label, className = "size-44" }: Props) {
  const rows = encodeQR(text, "raw", { ecc: "medium", border: 3 });
  const size = rows.length;
  return (
    <svg
      data-theme="sun"
      role="img"
      aria-label={label}
      viewBox={`0 0 ${size} ${size}`}
      className={`rounded-card ${className}`}
      shapeRendering="crispEdges"
    >
      <rect width={size} height={size} className="fill-float" />
      <path d={rows.map(rowPath).join("")} className="fill-ink" />
    </svg>
  );
}

/** The dark runs of one row. */
function rowPath(row: boolean[], y: number): string {
  let d = "";
  for (let x = 0; x < row.length;) {
    let end = x;
    while (row[end]) end++;
    if (end > x) d += `M${x} ${y}h${end - x}v1h-${end - x}z`;
    x = Math.max(end, x + 1);
  }
  return d;
}
