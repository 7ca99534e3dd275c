import { eq } from 'drizzle-orm';
import { create } from 'qrcode';
import type { Reader } from '@/db/client';
import { meets } from '@/db/schema';
import type { LineSnapshot } from '@/lib/live/contract';
import { lineSnapshot } from '@/server/queries/line/snapshot';

/** A QR code as a drawing: modules a side, and the SVG path of the dark ones. */
export interface QrDrawing {
  modules: number;
  path: string;
}

export interface JoinAddress {
  /** As it is typed: without the scheme. */
  text: string;
  url: string;
  qr: QrDrawing;
}

export interface BoardView {
  line: LineSnapshot;
  join: JoinAddress;
}

/** The QR code of `text`, able to lose a quarter of itself (level Q). */
export function qrDrawing(text: string): QrDrawing {
  const { size, data } = create(text, { errorCorrectionLevel: 'Q' }).modules;
  let path = '';
  for (let y = 0; y < size; y += 1) {
    for (let x = 0; x < size; x += 1) {
      let run = 0;
      while (x + run < size && data[y * size + x + run]) run += 1;
      if (run > 0) path += `M${x} ${y}h${run}v1h-${run}z`;
      x += run;
    }
  }
  return { modules: size, path };
}

/** Where visitors join the line of a meet. */
export function joinAddress(origin: string, slug: string): JoinAddress {
  const url = `${origin}/m/${slug}/join`;
  return { text: url.replace(/^https?:\/\//, ''), url, qr: qrDrawing(url) };
}

/** The board of a meet, or null when there is no such meet. */
export async function boardView(
  reader: Reader,
  slug: string,
  { origin, now }: { origin: string; now: Date },
): Promise<BoardView | null> {
  const [meet] = await reader.select({ id: meets.id }).from(meets).where(eq(meets.slug, slug));
  const line = meet ? await lineSnapshot(reader, meet.id, now) : null;
  return line ? { line, join: joinAddress(origin, slug) } : null;
}
