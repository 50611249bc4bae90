/** How a sheet lies on its pages: one page wide, as small as that needs. */
export interface PageFit {
  /** Across the page's long side. */
  wide: boolean;
  /** Size of ordinary text, in points. */
  points: number;
  /** Of the table, in points. */
  width: number;
  /** Each column's part of that width, in per cent. */
  shares: number[];
}

/** Between the margins of print.css, in points, on the narrower of A4 and Letter: 186 mm and 255 mm. */
const portrait = 527;
const landscape = 722;

const pointsPerPixel = 0.75;

/** Text for which a column of the grid is wide enough on paper too: its own of 11 points, less the cells' edges. */
const gridPoints = 10.2;
const largest = 10;
const readable = 7;
const smallest = 5;

export function pageFit(widths: readonly number[]): PageFit {
  const total = widths.reduce((sum, width) => sum + width, 0);
  const across = (page: number) => (gridPoints * page) / (total * pointsPerPixel);
  const wide = across(portrait) < readable;
  const points = Math.max(smallest, Math.min(largest, across(wide ? landscape : portrait)));
  return {
    wide,
    points: Math.floor(points * 10) / 10,
    width: Math.min(wide ? landscape : portrait, (total * pointsPerPixel * points) / gridPoints),
    shares: widths.map((width) => (100 * width) / total),
  };
}
