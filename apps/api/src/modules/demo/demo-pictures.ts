import sharp from 'sharp';

type Drawing = {
  readonly ground: string;
  readonly cake: string;
  readonly accent: string;
  readonly tiers: number;
};

/** Pictures the demo's people send and take. */
export const drawings = {
  barley: { ground: '#e7ecf8', cake: '#faf6ec', accent: '#f2b632', tiers: 3 },
  meadow: { ground: '#e2f2e8', cake: '#ffffff', accent: '#2c7a4b', tiers: 2 },
  rose: { ground: '#fbe6e9', cake: '#f6eeda', accent: '#d8455a', tiers: 1 },
  sky: { ground: '#f2f5f9', cake: '#dbe9f4', accent: '#8fb4d8', tiers: 2 },
} as const satisfies Record<string, Drawing>;

/** A picture as a customer might send one: drawn here, since the demo has no photographs. */
export async function drawInspiration({ ground, cake, accent, tiers }: Drawing): Promise<Buffer> {
  const blocks = Array.from({ length: tiers }, (_, index) => {
    const width = 560 - index * 140;
    const top = 900 - (index + 1) * 190;
    const left = 600 - width / 2;
    return `<rect x="${left}" y="${top}" width="${width}" height="190" rx="14" fill="${cake}"/>
      <rect x="${left}" y="${top + 160}" width="${width}" height="30" rx="12" fill="${accent}" opacity="0.55"/>`;
  }).join('');
  const top = 900 - tiers * 190;
  const petals = [0, 72, 144, 216, 288]
    .map(
      (turn) =>
        `<ellipse cx="600" cy="${top - 52}" rx="26" ry="46" fill="${accent}" transform="rotate(${turn} 600 ${top - 16})"/>`,
    )
    .join('');
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="1200" height="1100">
    <rect width="1200" height="1100" fill="${ground}"/>
    <rect y="900" width="1200" height="200" fill="#ffffff" opacity="0.6"/>
    ${blocks}${petals}
    <circle cx="600" cy="${top - 16}" r="16" fill="#fff5d3"/>
    <rect x="280" y="900" width="640" height="18" rx="9" fill="#14203d"/>
  </svg>`;
  return sharp(Buffer.from(svg)).png().toBuffer();
}
