"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.picture = picture;
const node_zlib_1 = require("node:zlib");
const dice_1 = require("./dice");
const WIDTH = 480;
const HEIGHT = 320;
const BOARD = [
    [38, 104, 74],
    [30, 88, 66],
    [44, 112, 84],
];
const COPPER = [186, 104, 54];
const SOLDER = [196, 196, 190];
const CORE = [86, 74, 62];
class Canvas {
    pixels = Buffer.alloc(WIDTH * HEIGHT * 3);
    box(x, y, width, height, colour) {
        for (let row = Math.max(0, y); row < Math.min(HEIGHT, y + height); row += 1)
            for (let column = Math.max(0, x); column < Math.min(WIDTH, x + width); column += 1)
                this.dot(column, row, colour);
    }
    ring(x, y, outer, inner, colour) {
        for (let row = Math.max(0, y - outer); row < Math.min(HEIGHT, y + outer); row += 1)
            for (let column = Math.max(0, x - outer); column < Math.min(WIDTH, x + outer); column += 1) {
                const distance = Math.hypot(column - x, row - y);
                if (distance < outer && distance >= inner)
                    this.dot(column, row, colour);
            }
    }
    dot(x, y, [red, green, blue]) {
        const at = (y * WIDTH + x) * 3;
        this.pixels[at] = red;
        this.pixels[at + 1] = green;
        this.pixels[at + 2] = blue;
    }
}
/** A drawn circuit board, a little different for each word: the demo club's photographs. PNG bytes. */
function picture(word, stage) {
    const dice = (0, dice_1.diceOf)(word);
    const canvas = new Canvas();
    canvas.box(0, 0, WIDTH, HEIGHT, [126, 112, 92]);
    canvas.box(24, 20, WIDTH - 48, HEIGHT - 40, BOARD[stage % BOARD.length] ?? [38, 104, 74]);
    const whole = (low, high) => Math.floor(dice.between(low, high));
    for (let trace = 0; trace < 14; trace += 1)
        canvas.box(whole(40, 360), whole(40, 280), whole(40, 110), 6, [72, 146, 108]);
    for (let pad = 0; pad < 40; pad += 1)
        canvas.ring(whole(40, 440), whole(36, 284), 6, 2, SOLDER);
    for (let core = 0; core < 2 + (stage % 3); core += 1) {
        const [x, y] = [whole(80, 400), whole(80, 240)];
        canvas.ring(x, y, 34, 14, CORE);
        for (let turn = 0; turn < 12; turn += 1) {
            const angle = (turn / 14) * 2 * Math.PI;
            canvas.ring(Math.round(x + 24 * Math.cos(angle)), Math.round(y + 24 * Math.sin(angle)), 7, 0, COPPER);
        }
    }
    canvas.box(whole(120, 320), whole(120, 200), 70, 40, [28, 28, 30]);
    return png(canvas.pixels);
}
/** Portable Network Graphics, 8 bits a channel, no filter (W3C PNG, third edition, 2025: from memory). */
function png(pixels) {
    const rows = Array.from({ length: HEIGHT }, (_, row) => Buffer.concat([Buffer.of(0), pixels.subarray(row * WIDTH * 3, (row + 1) * WIDTH * 3)]));
    const header = Buffer.alloc(13);
    header.writeUInt32BE(WIDTH, 0);
    header.writeUInt32BE(HEIGHT, 4);
    header.set([8, 2, 0, 0, 0], 8);
    const signature = Buffer.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a);
    return Buffer.concat([
        signature,
        chunk('IHDR', header),
        chunk('IDAT', (0, node_zlib_1.deflateSync)(Buffer.concat(rows))),
        chunk('IEND', Buffer.alloc(0)),
    ]);
}
function chunk(kind, data) {
    const body = Buffer.concat([Buffer.from(kind, 'ascii'), data]);
    const length = Buffer.alloc(4);
    length.writeUInt32BE(data.length);
    const check = Buffer.alloc(4);
    check.writeUInt32BE((0, node_zlib_1.crc32)(body));
    return Buffer.concat([length, body, check]);
}
//# sourceMappingURL=pictures.js.map