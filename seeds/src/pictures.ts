import { crc32, deflateSync } from 'node:zlib';
import { diceOf } from './dice';

const WIDTH = 480;
const HEIGHT = 320;

type Colour = readonly [number, number, number];

const BOARD: readonly Colour[] = [
  [38, 104, 74],
  [30, 88, 66],
  [44, 112, 84],
];
const BENCH: Colour = [126, 112, 92];
const TRACE: Colour = [72, 146, 108];
const CHIP: Colour = [28, 28, 30];
const COPPER: Colour = [186, 104, 54];
const SOLDER: Colour = [196, 196, 190];
const CORE: Colour = [86, 74, 62];

const PALETTE: readonly Colour[] = [...BOARD, BENCH, TRACE, CHIP, COPPER, SOLDER, CORE];

/** One byte a pixel, the colour's place in the palette: some two hundred are drawn at every laying of the club. */
class Canvas {
  readonly pixels = Buffer.alloc(WIDTH * HEIGHT);

  box(x: number, y: number, width: number, height: number, colour: Colour): void {
    const place = PALETTE.indexOf(colour);
    for (let row = Math.max(0, y); row < Math.min(HEIGHT, y + height); row += 1)
      this.pixels.fill(place, row * WIDTH + Math.max(0, x), row * WIDTH + Math.min(WIDTH, x + width));
  }

  ring(x: number, y: number, outer: number, inner: number, colour: Colour): void {
    const place = PALETTE.indexOf(colour);
    for (let row = Math.max(0, y - outer); row < Math.min(HEIGHT, y + outer); row += 1)
      for (let column = Math.max(0, x - outer); column < Math.min(WIDTH, x + outer); column += 1) {
        const square = (column - x) ** 2 + (row - y) ** 2;
        if (square < outer ** 2 && square >= inner ** 2) this.pixels[row * WIDTH + column] = place;
      }
  }
}

/** A drawn circuit board, a little different for each word: the demo club's photographs. PNG bytes. */
export function picture(word: string, stage: number): Buffer {
  const dice = diceOf(word);
  const canvas = new Canvas();
  canvas.box(0, 0, WIDTH, HEIGHT, BENCH);
  canvas.box(24, 20, WIDTH - 48, HEIGHT - 40, BOARD[stage % BOARD.length] ?? BENCH);
  const whole = (low: number, high: number): number => Math.floor(dice.between(low, high));
  for (let trace = 0; trace < 14; trace += 1)
    canvas.box(whole(40, 360), whole(40, 280), whole(40, 110), 6, TRACE);
  for (let pad = 0; pad < 40; pad += 1) canvas.ring(whole(40, 440), whole(36, 284), 6, 2, SOLDER);
  for (let core = 0; core < 2 + (stage % 3); core += 1) {
    const [x, y] = [whole(80, 400), whole(80, 240)];
    canvas.ring(x, y, 34, 14, CORE);
    for (let turn = 0; turn < 12; turn += 1) {
      const angle = (turn / 14) * 2 * Math.PI;
      canvas.ring(Math.round(x + 24 * Math.cos(angle)), Math.round(y + 24 * Math.sin(angle)), 7, 0, COPPER);
    }
  }
  canvas.box(whole(120, 320), whole(120, 200), 70, 40, CHIP);
  return png(canvas.pixels);
}

/** Portable Network Graphics, 8 bits a pixel with a palette, no filter (W3C PNG, third edition, 2025: from memory). */
function png(pixels: Buffer): Buffer {
  const rows = Array.from({ length: HEIGHT }, (_, row) =>
    Buffer.concat([Buffer.of(0), pixels.subarray(row * WIDTH, (row + 1) * WIDTH)]),
  );
  const header = Buffer.alloc(13);
  header.writeUInt32BE(WIDTH, 0);
  header.writeUInt32BE(HEIGHT, 4);
  header.set([8, 3, 0, 0, 0], 8);
  const signature = Buffer.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a);
  return Buffer.concat([
    signature,
    chunk('IHDR', header),
    chunk('PLTE', Buffer.from(PALETTE.flat())),
    chunk('IDAT', deflateSync(Buffer.concat(rows))),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

function chunk(kind: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(kind, 'ascii'), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}
