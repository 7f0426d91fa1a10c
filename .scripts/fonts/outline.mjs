/** Outlines of TrueType glyphs as lists of contours; a contour is a list of points { x, y, on } in font units, y up. */

/** All glyphs of a font, composites dissolved. */
export const readGlyphs = (tables) => {
  const count = tables.get('maxp').readUInt16BE(4);
  const long = tables.get('head').readInt16BE(50) === 1;
  const loca = tables.get('loca');
  const place = (i) => (long ? loca.readUInt32BE(4 * i) : 2 * loca.readUInt16BE(2 * i));
  const glyf = tables.get('glyf');
  const metrics = tables.get('hhea').readUInt16BE(34);
  const hmtx = tables.get('hmtx');
  const raw = (i) => glyf.subarray(place(i), place(i + 1));
  const contours = (i) => {
    const data = raw(i);
    if (data.length === 0) return [];
    return data.readInt16BE(0) >= 0 ? simple(data) : composite(data, contours);
  };
  return Array.from({ length: count }, (_, i) => ({
    advance: hmtx.readUInt16BE(4 * Math.min(i, metrics - 1)),
    contours: contours(i),
  }));
};

const simple = (data) => {
  const count = data.readInt16BE(0);
  const ends = Array.from({ length: count }, (_, i) => data.readUInt16BE(10 + 2 * i));
  const points = count === 0 ? 0 : ends.at(-1) + 1;
  let at = 10 + 2 * count;
  at += 2 + data.readUInt16BE(at);
  const flags = [];
  while (flags.length < points) {
    const flag = data[at++];
    const again = flag & 8 ? data[at++] : 0;
    for (let i = 0; i <= again; i++) flags.push(flag);
  }
  const along = (short, same) => {
    let value = 0;
    return flags.map((flag) => {
      if (flag & short) value += flag & same ? data[at++] : -data[at++];
      else if (!(flag & same)) {
        value += data.readInt16BE(at);
        at += 2;
      }
      return value;
    });
  };
  const xs = along(2, 16);
  const ys = along(4, 32);
  let start = 0;
  return ends.map((end) => {
    const contour = [];
    for (let i = start; i <= end; i++) contour.push({ x: xs[i], y: ys[i], on: (flags[i] & 1) === 1 });
    start = end + 1;
    return contour;
  });
};

const composite = (data, contours) => {
  const parts = [];
  let at = 10;
  let flags = 0;
  do {
    flags = data.readUInt16BE(at);
    const glyph = data.readUInt16BE(at + 2);
    at += 4;
    const [dx, dy] =
      flags & 1 ? [data.readInt16BE(at), data.readInt16BE(at + 2)] : [data.readInt8(at), data.readInt8(at + 1)];
    at += flags & 1 ? 4 : 2;
    const f = () => {
      at += 2;
      return data.readInt16BE(at - 2) / 16384;
    };
    let [a, b, c, d] = [1, 0, 0, 1];
    if (flags & 8) a = d = f();
    else if (flags & 0x40) [a, d] = [f(), f()];
    else if (flags & 0x80) [a, b, c, d] = [f(), f(), f(), f()];
    parts.push(...moved(contours(glyph), { a, b, c, d, dx, dy }));
  } while (flags & 0x20);
  return parts;
};

/** Contours under x' = a x + c y + dx, y' = b x + d y + dy; the direction of the contours is kept where the map mirrors. */
export const moved = (contours, { a = 1, b = 0, c = 0, d = 1, dx = 0, dy = 0 }) => {
  const mirror = a * d - b * c < 0;
  return contours.map((contour) => {
    const points = contour.map(({ x, y, on }) => ({
      x: Math.round(a * x + c * y + dx),
      y: Math.round(b * x + d * y + dy),
      on,
    }));
    return mirror ? points.reverse() : points;
  });
};

/** Bounding box of the points (curves of these faces have points at their extremes). */
export const boxOf = (contours) => {
  const points = contours.flat();
  if (points.length === 0) return { left: 0, bottom: 0, right: 0, top: 0 };
  const xs = points.map((p) => p.x);
  const ys = points.map((p) => p.y);
  return { left: Math.min(...xs), bottom: Math.min(...ys), right: Math.max(...xs), top: Math.max(...ys) };
};

/** One glyph as a simple glyph of the glyf table. */
export const writeGlyph = (contours) => {
  if (contours.length === 0) return Buffer.alloc(0);
  const box = boxOf(contours);
  const header = Buffer.alloc(10 + 2 * contours.length + 2);
  [contours.length, box.left, box.bottom, box.right, box.top].forEach((x, i) => {
    header.writeInt16BE(x, 2 * i);
  });
  let last = -1;
  contours.forEach((contour, i) => {
    last += contour.length;
    header.writeUInt16BE(last, 10 + 2 * i);
  });
  const points = contours.flat();
  const flags = points.map((p) => (p.on ? 1 : 0));
  const xs = deltas(
    points.map((p) => p.x),
    flags,
    2,
    16,
  );
  const ys = deltas(
    points.map((p) => p.y),
    flags,
    4,
    32,
  );
  return Buffer.concat([header, repeated(flags), xs, ys]);
};

/** Coordinates as differences; marks in the flags which are short and which are zero. */
const deltas = (values, flags, short, same) => {
  const bytes = [];
  let last = 0;
  values.forEach((value, i) => {
    const step = value - last;
    last = value;
    if (step === 0) flags[i] |= same;
    else if (Math.abs(step) < 256) {
      flags[i] |= short | (step > 0 ? same : 0);
      bytes.push(Math.abs(step));
    } else bytes.push((step >> 8) & 255, step & 255);
  });
  return Buffer.from(bytes);
};

const repeated = (flags) => {
  const bytes = [];
  for (let i = 0; i < flags.length; ) {
    let run = 1;
    while (run < 256 && flags[i + run] === flags[i]) run++;
    if (run > 1) bytes.push(flags[i] | 8, run - 1);
    else bytes.push(flags[i]);
    i += run;
  }
  return Buffer.from(bytes);
};
