import { useId } from "react";
import { drawPlant } from "../../shared/domain/look/drawPlant.ts";
import { drawRoots } from "../../shared/domain/look/drawRoots.ts";
import type { PlantDrawing } from "../../shared/domain/look/plantDrawing.ts";
import { PictureShapes } from "./PictureShapes.tsx";

type Props = { plants: { slug: string; drawing: PlantDrawing; days: number }[]; className?: string | undefined };

/** Plants stand this far apart, a little less than they are wide, so that they crowd as they do on a table. */
const pitch = 500;

/** Several plants on one waterline, for the head of a page; decoration. */
export function PlantBed({ plants, className }: Props) {
  const id = useId();
  const width = pitch * plants.length + 120;
  const places = plants.map((plant, index) => ({ ...plant, x: 60 + pitch * (index + 0.5) }));
  return (
    <svg viewBox={`0 -400 ${width} 560`} className={className} aria-hidden="true">
      <linearGradient id={id} x1="0" y1="0" x2="0" y2="1">
        <stop offset="0.2" className="[stop-color:var(--water)]" />
        <stop offset="1" className="[stop-color:var(--water)]" stopOpacity="0" />
      </linearGradient>
      <rect width={width} height="160" fill={`url(#${id})`} />
      {places.map(({ slug, days, x }) => (
        <g key={slug} transform={`translate(${x} 0)`}>
          <PictureShapes picture={drawRoots(slug, days)} />
        </g>
      ))}
      <path d={`M0 0H${width}`} className="stroke-water-deep" strokeWidth="8" />
      {places.map(({ slug, drawing, x }) => (
        <g key={slug} transform={`translate(${x} -3)`}>
          <PictureShapes picture={drawPlant(slug, drawing)} />
        </g>
      ))}
    </svg>
  );
}
