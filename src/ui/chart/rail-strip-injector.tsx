import { formatSigned } from "../../format/format-number";
import type { RailStripInjector as Injector, RailStripBar } from "../../format/picture/rail-strip";
import { classNames } from "../class-names";

type Props = { injector: Injector; labelY: number | null; crowd: "always" | "wide only" | "never" };

export function RailStripInjector({ injector, labelY, crowd }: Props) {
  const { label, x, stem, found, left } = injector;
  return (
    <g>
      <line x1={`${x}%`} x2={`${x}%`} y1={stem.y1} y2={stem.y2} className="stroke-hair" strokeWidth="1" />
      {found ? <Bar bar={found} lettered={labelY !== null} className="fill-found stroke-found-edge" /> : null}
      {left ? (
        <Bar
          bar={left}
          lettered={labelY !== null}
          className={left.outside ? "fill-out stroke-out" : "fill-petrol stroke-petrol"}
        />
      ) : null}
      {labelY !== null && crowd !== "never" ? (
        <text
          x={`${x}%`}
          y={labelY - 2}
          textAnchor="middle"
          className={classNames(
            "text-key",
            left?.outside ? "fill-out font-semibold" : "fill-ink-2",
            crowd === "wide only" && "max-tablet:hidden",
          )}
        >
          {label}
        </text>
      ) : null}
    </g>
  );
}

function Bar({ bar, lettered, className }: { bar: RailStripBar; lettered: boolean; className: string }) {
  const { x, y, width, height, clipped, percent } = bar;
  return (
    <>
      <rect x={`${x}%`} y={y} width={`${width}%`} height={height} strokeWidth="0.75" className={className} />
      {clipped ? <Break {...bar} /> : null}
      {clipped && lettered ? (
        <text
          x={`${x + width / 2}%`}
          y={clipped === "high" ? y - 3 : y + height + 10}
          textAnchor="middle"
          className="fill-ink-2 text-[10px]"
        >
          {formatSigned(percent, "closure").replace(/\.?\d$/, "")}
        </text>
      ) : null}
    </>
  );
}

/** Two gaps near the end say that the bar is longer than it is drawn. */
function Break({ x, y, width, height, clipped }: RailStripBar) {
  const at = clipped === "high" ? y + 4 : y + height - 8;
  return (
    <g className="fill-sheet">
      <rect x={`${x - 1}%`} y={at} width={`${width + 2}%`} height="1.5" />
      <rect x={`${x - 1}%`} y={at + 3} width={`${width + 2}%`} height="1.5" />
    </g>
  );
}
