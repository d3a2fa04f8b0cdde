/** A cap of 120 on a biceps line of 340, as the drafting engine draws it; units are millimetres of that sleeve. */
const outline =
  "M-170 120C-152.1 120-136.1 110.5-123.6 97.7-108.7 82.5-99 63.2-86.1 46.3-75.7 32.7-63.2 20.7-48.2 12.4-33.5 4.2-16.9 0 0 0" +
  "S33.3 4.6 48.2 12.4C63.3 20.3 76.6 31.3 87.5 44.3 101.1 60.6 110.9 79.9 125 95.8 136.9 109.2 152.2 120 170 120L145 200H-145Z";

/** The picture at the head of the start: a sleeve on the table, cut line, stitch line, guides, notches, grain. */
export function SleeveDrawing() {
  return (
    <svg
      aria-hidden="true"
      viewBox="-200 -14 400 250"
      className="mx-auto w-full max-w-[15rem] lg:max-w-[24rem]"
    >
      <g fill="none" stroke="currentColor" strokeLinejoin="round" strokeLinecap="round">
        <path d={outline} className="fill-card text-ink" strokeWidth="4" />
        <path
          d={outline}
          transform="translate(0 9.5) scale(0.925 0.915)"
          className="text-ink"
          strokeWidth="1.8"
          strokeDasharray="9 6"
        />
        <g className="text-chalk" strokeWidth="1.8">
          <path d="M-157 120H157M-12 0-170 120M12 0 170 120" strokeDasharray="2 6" />
          <path d="M0 34V186M-7 46 0 34 7 46M-7 174 0 186 7 174" strokeWidth="2.4" />
        </g>
        <g className="fill-ink text-ink" strokeWidth="1">
          <path d="M-110 80-99 64-92 79Z" />
          <path d="M113 82 103 66 96 80ZM104 69 94 53 87 68Z" />
        </g>
      </g>
      <Tape />
    </svg>
  );
}

/** A piece of tape along the lower edge, ticked in eighths. */
function Tape() {
  const inch = 40;
  const ticks = Array.from({ length: 73 }, (_, i) => {
    const reach = i % 8 === 0 ? 16 : i % 4 === 0 ? 11 : i % 2 === 0 ? 8 : 5;
    return `M${-180 + (i * inch) / 8} 214v${reach}`;
  }).join("");
  return (
    <g className="text-edge" stroke="currentColor" strokeWidth="1.6" fill="none">
      <path d="M-190 214H190" strokeWidth="2.4" />
      <path d={ticks} />
    </g>
  );
}
