import type { ImageRequest } from "@/lib/map/layers";
import { MARKS_BY_RANK, type MarkCounts, worstOf } from "@/lib/map/map-anchor";
import { MARK_BOX, MARK_SHAPES, type Mark } from "@/lib/map/marks";
import type { Palette } from "@/lib/map/palette";

/** Room around a mark, so that it stands clear of lines and of its neighbours. */
const HALO_PX = 2.5;

/** Draws what a layer asked for. `ratio`: picture pixels per CSS pixel. Null where there is no canvas. */
export function drawPicture(request: ImageRequest, palette: Palette, ratio: number): ImageData | null {
  if (request.kind === "tag") return drawTag(request.counts, palette, ratio);
  const size = request.kind === "mark" ? MARK_BOX + 2 * HALO_PX : 44;
  return onCanvas(size, size, ratio, (pen) => {
    if (request.kind === "brackets") {
      drawBrackets(pen, size, palette);
      return;
    }
    pen.translate(HALO_PX, HALO_PX);
    drawMark(pen, request.mark, palette);
  });
}

function drawMark(pen: CanvasRenderingContext2D, mark: Mark, palette: Palette) {
  const { d, stroke, tone } = MARK_SHAPES[mark];
  const path = new Path2D(d);
  pen.lineJoin = "round";
  pen.fillStyle = palette.paper;
  pen.strokeStyle = palette.paper;
  pen.lineWidth = (stroke?.width ?? 0) + 2 * HALO_PX;
  pen.stroke(path);
  pen.fill(path);
  pen.fillStyle = palette[tone];
  pen.strokeStyle = palette[tone];
  if (stroke === null) {
    pen.fill(path);
    return;
  }
  pen.lineWidth = stroke.width;
  pen.setLineDash(stroke.dash ? [...stroke.dash] : []);
  pen.stroke(path);
  pen.setLineDash([]);
}

/** Four corners around a chosen mark, as a part is marked for a detail drawing. */
function drawBrackets(pen: CanvasRenderingContext2D, size: number, palette: Palette) {
  const [near, far, arm] = [4, size - 4, 10];
  const corners = new Path2D(
    `M${near} ${near + arm}V${near}H${near + arm}M${far - arm} ${near}H${far}V${near + arm}` +
      `M${far} ${far - arm}V${far}H${far - arm}M${near + arm} ${far}H${near}V${far - arm}`,
  );
  pen.strokeStyle = palette.paper;
  pen.lineWidth = 6;
  pen.stroke(corners);
  pen.strokeStyle = palette.ink;
  pen.lineWidth = 2.5;
  pen.stroke(corners);
}

const TAG = { height: 32, markPx: 18, strip: 4 } as const;

/** A group of anchors: a tag with its worst mark, how many there are, and their split along the lower edge. */
function drawTag(counts: MarkCounts, palette: Palette, ratio: number): ImageData | null {
  const worst = worstOf(counts);
  if (worst === null) return null;
  const total = MARKS_BY_RANK.reduce((sum, mark) => sum + counts[mark], 0);
  const width = 34 + 9.5 * String(total).length + 8;
  return onCanvas(width + 4, TAG.height + 4, ratio, (pen) => {
    pen.translate(2, 2);
    const outline = new Path2D(`M7 0H${width}V${TAG.height}H7L0 ${TAG.height - 7}V7Z`);
    pen.fillStyle = palette.paper;
    pen.fill(outline);
    pen.save();
    pen.clip(outline);
    drawSplit(pen, counts, total, width, palette);
    pen.restore();
    pen.save();
    pen.translate(7, (TAG.height - TAG.strip - TAG.markPx) / 2);
    pen.scale(TAG.markPx / MARK_BOX, TAG.markPx / MARK_BOX);
    drawMark(pen, worst, palette);
    pen.restore();
    pen.strokeStyle = palette.ink;
    pen.lineWidth = 1.5;
    pen.stroke(outline);
    pen.fillStyle = palette.ink;
    pen.font = `650 16px ${labelFamily()}`;
    pen.textBaseline = "middle";
    pen.fillText(String(total), 31, (TAG.height - TAG.strip) / 2 + 1);
  });
}

function drawSplit(
  pen: CanvasRenderingContext2D,
  counts: MarkCounts,
  total: number,
  width: number,
  palette: Palette,
) {
  let x = 0;
  for (const mark of MARKS_BY_RANK) {
    const share = (counts[mark] / total) * width;
    pen.fillStyle = palette[MARK_SHAPES[mark].tone];
    pen.fillRect(x, TAG.height - TAG.strip, share, TAG.strip);
    x += share;
  }
}

function labelFamily(): string {
  const family = getComputedStyle(document.documentElement).getPropertyValue("--font-archivo").trim();
  return family === "" ? "sans-serif" : `${family}, sans-serif`;
}

function onCanvas(
  widthPx: number,
  heightPx: number,
  ratio: number,
  draw: (pen: CanvasRenderingContext2D) => void,
): ImageData | null {
  const canvas = document.createElement("canvas");
  canvas.width = Math.ceil(widthPx * ratio);
  canvas.height = Math.ceil(heightPx * ratio);
  const pen = canvas.getContext("2d");
  if (!pen) return null;
  pen.scale(ratio, ratio);
  draw(pen);
  return pen.getImageData(0, 0, canvas.width, canvas.height);
}
