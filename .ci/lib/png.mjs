/**
 * Makes a screenshot small: its few hundred shades become at most 256 in a palette, which halves the file and cannot
 * be seen. Reads what Chromium writes (8-bit RGB or RGBA, not interlaced) and gives an indexed PNG without transparency.
 * PNG specification, third edition (W3C 2025), clauses 5, 9 and 11.
 */
import { Buffer } from 'node:buffer';
import { crc32, deflateSync, inflateSync } from 'node:zlib';

const signature = Buffer.from([137, 80, 78, 71, 13, 10, 26, 10]);

function chunks(png) {
  const found = [];
  for (let at = signature.length; at < png.length;) {
    const length = png.readUInt32BE(at);
    found.push({ type: png.toString('latin1', at + 4, at + 8), data: png.subarray(at + 8, at + 8 + length) });
    at += length + 12;
  }
  return found;
}

function chunk(type, data) {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const whole = Buffer.alloc(body.length + 8);
  whole.writeUInt32BE(data.length);
  body.copy(whole, 4);
  whole.writeUInt32BE(crc32(body), body.length + 4);
  return whole;
}

function paeth(left, up, corner) {
  const guess = left + up - corner;
  const [a, b, c] = [Math.abs(guess - left), Math.abs(guess - up), Math.abs(guess - corner)];
  return a <= b && a <= c ? left : b <= c ? up : corner;
}

/** Undoes the filter of each line; answers the bytes of all pixels, line after line. */
function pixels(filtered, height, stride, size) {
  const out = new Uint8Array(height * stride);
  for (let y = 0; y < height; y += 1) {
    const kind = filtered[y * (stride + 1)];
    for (let x = 0; x < stride; x += 1) {
      const at = y * stride + x;
      const left = x >= size ? out[at - size] : 0;
      const up = y > 0 ? out[at - stride] : 0;
      const corner = x >= size && y > 0 ? out[at - stride - size] : 0;
      const add = [0, left, up, (left + up) >> 1, paeth(left, up, corner)][kind];
      out[at] = filtered[y * (stride + 1) + 1 + x] + add;
    }
  }
  return out;
}

/** The 256 commonest colours, and for each colour the place of the nearest of them. */
function palette(colours) {
  const counts = new Map();
  for (const colour of colours) counts.set(colour, (counts.get(colour) ?? 0) + 1);
  const kept = [...counts].sort((a, b) => b[1] - a[1]).slice(0, 256).map(([colour]) => colour);
  const parts = (colour) => [colour >> 16, (colour >> 8) & 255, colour & 255];
  const keptParts = kept.map(parts);
  const places = new Map();
  for (const colour of counts.keys()) {
    const [r, g, b] = parts(colour);
    let best = 0;
    let least = Infinity;
    for (const [place, [r2, g2, b2]] of keptParts.entries()) {
      const away = (r - r2) ** 2 + (g - g2) ** 2 + (b - b2) ** 2;
      if (away < least) [best, least] = [place, away];
    }
    places.set(colour, best);
  }
  return { bytes: Buffer.from(keptParts.flat()), places };
}

/** @param {Buffer} png @returns {Buffer} */
export function smallerPng(png) {
  const parts = chunks(png);
  const header = parts.find(({ type }) => type === 'IHDR').data;
  const [width, height] = [header.readUInt32BE(0), header.readUInt32BE(4)];
  const size = { 2: 3, 6: 4 }[header[9]];
  if (header[8] !== 8 || size === undefined || header[12] !== 0) return png;
  const data = Buffer.concat(parts.filter(({ type }) => type === 'IDAT').map((part) => part.data));
  const bytes = pixels(inflateSync(data), height, width * size, size);
  const colours = new Uint32Array(width * height);
  for (let i = 0; i < colours.length; i += 1) colours[i] = (bytes[i * size] << 16) | (bytes[i * size + 1] << 8) | bytes[i * size + 2];
  const { bytes: shades, places } = palette(colours);
  const lines = Buffer.alloc(height * (width + 1));
  for (let i = 0; i < colours.length; i += 1) lines[Math.floor(i / width) * (width + 1) + 1 + (i % width)] = places.get(colours[i]);
  const indexed = Buffer.from(header);
  indexed[9] = 3;
  return Buffer.concat([
    signature, chunk('IHDR', indexed), chunk('PLTE', shades), chunk('IDAT', deflateSync(lines, { level: 9 })), chunk('IEND', Buffer.alloc(0)),
  ]);
}
