/** The torn edge of paper: `count` teeth of 12 by 6, to the right or back to the left. */
const teeth = (count: number, direction: 1 | -1): string =>
  Array.from({ length: count }, () => `l${6 * direction} ${-6 * direction} ${6 * direction} ${6 * direction}`).join('');

const PAPER = `M204 56${teeth(14, 1)}V262${teeth(14, -1)}z`;

const Cylinder = () => (
  <g>
    <path d="M44 64V30h10v18h58V30h10v34z" fill="#8b979c" />
    <path d="M76 24h14v28H76z" fill="#b9c3c6" />
    <path d="M58 27h18v7H58z" fill="#2b6ea3" />
    <path d="M90 36h18v7H90z" fill="#b3121d" />
    <path d="M20 128c0-46 28-68 63-68s63 22 63 68z" fill="#f5c400" />
    <path d="M20 128h126v132a10 10 0 0 1-10 10H30a10 10 0 0 1-10-10z" fill="#aab4b7" />
    <path d="M20 128h20v142H30a10 10 0 0 1-10-10z" fill="#c7d0d3" />
    <path d="M20 190h126M20 128h126" stroke="#3a4347" strokeOpacity=".35" strokeWidth="1.5" />
    <text x="90" y="236" textAnchor="middle" className="font-mono" fontSize="17" fontWeight="600" fill="#15191b">
      R‑410A
    </text>
  </g>
);

const Scale = () => (
  <g>
    <path d="M2 272h164v10H2z" fill="#5a666b" />
    <path d="M10 282h148v30H10z" fill="#3a4347" />
    <path d="M38 287h92v20H38z" fill="#14181a" />
    <text x="122" y="302" textAnchor="end" className="font-mono" fontSize="15" fontWeight="600" fill="#f5c400">
      38.7 lb
    </text>
  </g>
);

const Paper = () => (
  <g className="font-mono" fontSize="13" fill="var(--ink-2)">
    <path d={PAPER} fill="var(--sheet)" />
    <text x="222" y="88" fontWeight="600" fill="var(--ink)">
      TICKET 20417
    </text>
    <text x="222" y="120">
      Tare
    </text>
    <text x="354" y="120" textAnchor="end">
      24.2
    </text>
    <text x="222" y="144">
      Gross
    </text>
    <text x="354" y="144" textAnchor="end">
      38.7
    </text>
    <path d="M222 160h132" stroke="var(--ink)" strokeWidth="2" />
    <text x="220" y="197" fontSize="32" fontWeight="500" letterSpacing="-1" fill="var(--ink)">
      14.5
    </text>
    <text x="354" y="197" textAnchor="end">
      lb net
    </text>
    <path d="M222 212h132" stroke="var(--rule)" />
    <text x="222" y="237">
      of 15.0 lb
    </text>
    <text x="354" y="237" textAnchor="end">
      97%
    </text>
  </g>
);

/** A recovery cylinder on a scale and the ticket it printed: what the product is about, drawn. */
export const TicketPicture = () => (
  <svg viewBox="0 0 374 318" className="h-auto w-full max-w-[24rem]" role="img" aria-labelledby="ticket-picture">
    <title id="ticket-picture">A recovery cylinder on a scale beside the ticket that the scale printed</title>
    <Cylinder />
    <Scale />
    <Paper />
  </svg>
);
