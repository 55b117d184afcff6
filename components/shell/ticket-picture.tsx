const LINES = [
  ['Tare', '24.2'],
  ['Gross', '38.7'],
] as const;

/** A recovery cylinder on a scale and the ticket it printed: what the product is about, drawn. */
export const TicketPicture = () => (
  <svg viewBox="0 0 380 330" className="h-auto w-full max-w-[23.75rem]" role="img" aria-labelledby="ticket-picture">
    <title id="ticket-picture">A recovery cylinder on a scale beside the ticket that the scale printed</title>
    <g>
      <path d="M62 20h12v16H62zM80 28h22v8H80z" fill="var(--edge)" />
      <path d="M72 16h22v30H72z" fill="#b9c3c6" />
      <path d="M50 46h66v16H50z" fill="#dfe5e7" />
      <path d="M50 46V26h8v20M108 46V26h8v20" fill="none" stroke="#b9c3c6" strokeWidth="6" />
      <path d="M20 128c0-46 28-68 63-68s63 22 63 68z" fill="#f5c400" />
      <path d="M20 128h126v132a10 10 0 0 1-10 10H30a10 10 0 0 1-10-10z" fill="#aab4b7" />
      <path d="M20 128h22v142H30a10 10 0 0 1-10-10z" fill="#c7d0d3" />
      <path d="M20 188h126M20 128h126" stroke="#3a4347" strokeOpacity=".35" strokeWidth="1.5" />
      <text x="83" y="234" textAnchor="middle" className="font-mono" fontSize="17" fontWeight="600" fill="#15191b">
        R‑410A
      </text>
    </g>
    <g>
      <path d="M2 272h164v10H2z" fill="var(--body-2)" />
      <path d="M10 282h148v30H10z" fill="var(--body)" />
      <path d="M44 287h80v20H44z" fill="#14181a" />
      <text x="118" y="302" textAnchor="end" className="font-mono" fontSize="15" fontWeight="600" fill="#f5c400">
        38.7 lb
      </text>
    </g>
    <g>
      <path
        d="M206 64l6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6 6-6 6 6v206l-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6-6 6-6-6z"
        fill="var(--sheet)"
      />
      <g className="font-mono" fontSize="13" fill="var(--ink-2)">
        <text x="222" y="94" fontWeight="600" fill="var(--ink)">
          TICKET 20417
        </text>
        {LINES.map(([label, value], index) => (
          <g key={label}>
            <text x="222" y={126 + index * 24}>
              {label}
            </text>
            <text x="346" y={126 + index * 24} textAnchor="end">
              {value}
            </text>
          </g>
        ))}
        <path d="M222 164h124" stroke="var(--ink)" strokeWidth="2" />
        <text x="222" y="198">
          lb net
        </text>
        <text x="346" y="200" textAnchor="end" fontSize="30" fontWeight="500" fill="var(--ink)">
          14.5
        </text>
        <path d="M222 214h124" stroke="var(--rule)" />
        <text x="222" y="238">
          of 15.0 lb
        </text>
        <text x="346" y="238" textAnchor="end">
          97%
        </text>
      </g>
    </g>
  </svg>
);
