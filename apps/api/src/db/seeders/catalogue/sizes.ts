/** Millimetres to the nearest whole; one inch is 25.4 mm exactly. */
const mm = (inches: number) => Math.round(inches * 25.4);

/** What the studio has tins for. */
const heights = [3, 4, 5, 6, 7].map(mm);

const evenSided = (shape: 'round' | 'square', inches: number) => ({
  id: `${shape}-${inches}`,
  shape,
  widthMm: mm(inches),
  depthMm: mm(inches),
  heightsMm: heights,
});

const rectangle = (width: number, depth: number) => ({
  id: `rectangle-${width}x${depth}`,
  shape: 'rectangle' as const,
  widthMm: mm(width),
  depthMm: mm(depth),
  heightsMm: [3, 4, 5].map(mm),
});

export const tierSizes = [
  ...[4, 5, 6, 7, 8, 9, 10, 12, 14].map((inches) => evenSided('round', inches)),
  ...[4, 6, 8, 10, 12, 14].map((inches) => evenSided('square', inches)),
  rectangle(9, 6),
  rectangle(12, 8),
  rectangle(14, 10),
];

/** Sheets, cut 50 by 50 mm. */
export const sheetSizes = [
  { id: 'quarter', name: 'Quarter sheet, 9 × 13 in', widthMm: 330, depthMm: 229, heightMm: 50 },
  { id: 'half', name: 'Half sheet, 13 × 18 in', widthMm: 457, depthMm: 330, heightMm: 50 },
  { id: 'full', name: 'Full sheet, 18 × 26 in', widthMm: 660, depthMm: 457, heightMm: 50 },
] as const;

/** Footprints at full tier height; published tables disagree by 20 %, so they are a setting. */
export const portionSizes = [
  {
    id: 'coffee',
    name: 'Coffee',
    widthMm: 25,
    depthMm: 25,
    blurb: 'Two bites, after a long dinner.',
  },
  {
    id: 'dessert',
    name: 'Dessert',
    widthMm: 25,
    depthMm: 50,
    blurb: 'A slim slice, 1 × 2 in; usual at weddings.',
  },
  { id: 'party', name: 'Party', widthMm: 38, depthMm: 50, blurb: 'A proper slice, 1½ × 2 in.' },
] as const;

export const occasions = [
  { id: 'wedding', name: 'Wedding', noticeDays: 14 },
  { id: 'birthday', name: 'Birthday', noticeDays: 0 },
  { id: 'child-birthday', name: 'Child’s birthday', noticeDays: 0 },
  { id: 'anniversary', name: 'Anniversary', noticeDays: 0 },
  { id: 'baby', name: 'Christening or new baby', noticeDays: 0 },
  { id: 'graduation', name: 'Graduation', noticeDays: 0 },
  { id: 'retirement', name: 'Retirement or farewell', noticeDays: 0 },
  { id: 'holiday', name: 'Holiday table', noticeDays: 0 },
  { id: 'company', name: 'Company event', noticeDays: 0 },
  { id: 'other', name: 'Something else', noticeDays: 0 },
] as const;
