import type { ChartHandle } from './EChart';
import { fontSheet } from './fontSheet';

/** What can be saved of a chart beside its drawing. */
export interface SavedPlot {
  /** For the file's name. */
  title: string;
  /** Its figures as CSV. */
  csv: () => string;
}

export const PLOT_FORMATS = ['PNG', 'SVG', 'CSV'] as const;
export type PlotFormat = (typeof PLOT_FORMATS)[number];

/** Pixels of the picture for one of the page. */
const SHARPNESS = 2;

/** Saves a chart as a file: its drawing on the page's colour, or its figures. */
export async function savePlot(
  plot: SavedPlot,
  chart: ChartHandle,
  as: PlotFormat,
  paper: string,
): Promise<void> {
  const blob = as === 'CSV' ? csvBlob(plot) : await drawingBlob(chart, as, paper);
  if (blob) download(blob, `${plot.title.toLowerCase().replace(/[^a-z0-9]+/g, '-')}.${as.toLowerCase()}`);
}

function csvBlob(plot: SavedPlot): Blob {
  return new Blob([plot.csv()], { type: 'text/csv;charset=utf-8' });
}

async function drawingBlob(chart: ChartHandle, as: 'PNG' | 'SVG', paper: string): Promise<Blob | null> {
  const drawing = chart.svg();
  if (!drawing) return null;
  const ground = `<rect width="100%" height="100%" fill="${paper}"/><style>${await fontSheet()}</style>`;
  const text = drawing.text.replace(/^<svg[^>]*>/, (tag) => `${tag}${ground}`);
  const svg = new Blob([text], { type: 'image/svg+xml' });
  return as === 'SVG' ? svg : rasterise(svg, drawing.width, drawing.height);
}

async function rasterise(svg: Blob, width: number, height: number): Promise<Blob | null> {
  const url = URL.createObjectURL(svg);
  try {
    const canvas = document.createElement('canvas');
    canvas.width = width * SHARPNESS;
    canvas.height = height * SHARPNESS;
    await draw(url, canvas);
    await new Promise(requestAnimationFrame);
    await draw(url, canvas);
    return await new Promise((resolve) => canvas.toBlob(resolve, 'image/png'));
  } finally {
    URL.revokeObjectURL(url);
  }
}

/** The font within a drawing is asked for when it is drawn: the next one that holds it has it from the start. */
async function draw(url: string, canvas: HTMLCanvasElement): Promise<void> {
  const { width, height } = canvas;
  const image = new Image(width, height);
  image.src = url;
  await image.decode();
  const context = canvas.getContext('2d')!;
  context.clearRect(0, 0, width, height);
  context.drawImage(image, 0, 0, width, height);
}

function download(blob: Blob, name: string): void {
  const link = document.createElement('a');
  link.href = URL.createObjectURL(blob);
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}
