import { useId } from "react";
import {
  awningTile,
  awningTileSize as side,
  canopyPaths,
  pin,
  type AwningDrawing,
  type AwningTile,
} from "../../shared/domain/look/awning.ts";

type Props = AwningDrawing & {
  /** In CSS pixels. */
  height?: number | undefined;
  /** Black line work, for paper. */
  mono?: boolean | undefined;
  className?: string | undefined;
};

/** A market's awning across the whole width it is given, scalloped along its lower edge. Decoration: the name stands beside it. */
export function Awning({ pattern, colour, height = 18, mono = false, className = "" }: Props) {
  const id = useId();
  const tile = awningTile({ pattern, colour }, mono);
  const canopy = canopyPaths(height);
  return (
    <svg width="100%" height={height} className={`block ${className}`} aria-hidden="true">
      <defs>
        <pattern id={`${id}cloth`} width={side} height={side} patternUnits="userSpaceOnUse">
          <Cloth {...tile} />
        </pattern>
        <pattern id={`${id}canopy`} width={side} height={height} patternUnits="userSpaceOnUse">
          <path d={canopy.cloth} fill={`url(#${id}cloth)`} />
          <path d={canopy.edge} fill="none" stroke={tile.print} strokeWidth="1.5" />
        </pattern>
      </defs>
      <rect width="100%" height={height} fill={`url(#${id}canopy)`} />
    </svg>
  );
}

/** A market's mark for lists and legends: a little stall under its awning. */
export function AwningPin({ pattern, colour, mono = false, className = "h-13 w-11" }: Omit<Props, "height">) {
  const id = useId();
  const [width, height] = pin.size;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      className={`shrink-0 ${className}`}
      aria-hidden="true"
      stroke={pin.outline}
      strokeWidth="2"
      strokeLinejoin="round"
    >
      <defs>
        <pattern id={id} width={side} height={side} x="8" y="-2" patternUnits="userSpaceOnUse">
          <Cloth {...awningTile({ pattern, colour }, mono)} />
        </pattern>
      </defs>
      <path d={pin.stall} fill={pin.wall} />
      <path d={pin.canopy} fill={`url(#${id})`} />
    </svg>
  );
}

function Cloth({ cloth, print, d, width }: AwningTile) {
  return (
    <g stroke="none">
      <rect width={side} height={side} fill={cloth} />
      {width ? <path d={d} fill="none" stroke={print} strokeWidth={width} /> : <path d={d} fill={print} />}
    </g>
  );
}
