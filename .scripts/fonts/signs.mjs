import { boxOf, moved } from './outline.mjs';

/**
 * Signs that the face lacks, made from its own glyphs or drawn to its stroke width: `glyph(character)` gives a glyph of the face,
 * `numerator(digit)` and `denominator(digit)` its small digits. Font units, 1000 to the em.
 */
export const makeSigns = ({ glyph, numerator, denominator, slant }) => {
  const stroke = heightOf(glyph('−'));
  const axis = middleOf(glyph('−'));
  const digits = '0123456789';
  const signs = new Map();
  const put = (character, advance, contours) => signs.set(character, { advance, contours });
  const lean = (contours) => moved(contours, { c: slant, dx: -slant * axis });

  for (const [from, to] of [
    ['<', '≤'],
    ['>', '≥'],
  ])
    put(to, glyph(from).advance, withBar(glyph(from).contours, stroke, slant));
  put('≠', glyph('=').advance, [...glyph('=').contours, ...lean([slash(glyph('='), axis, stroke)])]);
  put('≈', glyph('~').advance, [
    ...moved(glyph('~').contours, { dy: 105, dx: slant * 105 }),
    ...moved(glyph('~').contours, { dy: -105, dx: -slant * 105 }),
  ]);
  put('∑', glyph('Σ').advance, glyph('Σ').contours);
  put('∆', glyph('Δ').advance, glyph('Δ').contours);
  put('√', 600, lean([root(stroke)]));
  put('∞', 820, lean(infinity(axis, stroke)));
  put('⌀', 720, lean(diameter(stroke)));
  put('✓', 640, lean([tick(stroke)]));
  put('□', 640, frame(stroke));
  for (const [character, turn] of [
    ['→', -1],
    ['←', 1],
  ])
    put(character, ...turned(glyph('↑'), turn, axis));
  superscripts(put, glyph, numerator, slant, digits);
  for (const digit of digits) {
    const { advance, contours } = denominator(digit);
    put('₀₁₂₃₄₅₆₇₈₉'[Number(digit)], advance, moved(contours, { dy: -150, dx: -slant * 150 }));
  }
  for (const [character, top] of [
    ['⅛', '1'],
    ['⅜', '3'],
    ['⅝', '5'],
    ['⅞', '7'],
  ])
    put(character, ...eighths(top, numerator, denominator, glyph));
  put('\u2009', 200, []);
  put('\u200a', 100, []);
  put('\u202f', 160, []);
  return signs;
};

const heightOf = ({ contours }) => boxOf(contours).top - boxOf(contours).bottom;
const middleOf = ({ contours }) => (boxOf(contours).top + boxOf(contours).bottom) / 2;

const polygon = (...pairs) => pairs.map(([x, y]) => ({ x: Math.round(x), y: Math.round(y), on: true }));

const withBar = (contours, stroke, slant) => {
  const raised = moved(contours, { dy: 70, dx: slant * 70 });
  const { left, right, bottom } = boxOf(raised);
  const [low, high] = [bottom - 60 - stroke, bottom - 60];
  const shift = (y) => slant * (y - bottom);
  return [
    ...raised,
    polygon(
      [left + shift(low), low],
      [left + shift(high), high],
      [right + shift(high), high],
      [right + shift(low), low],
    ),
  ];
};

/** A slanted stroke across the equals sign. */
const slash = (equals, axis, stroke) => {
  const { left, right } = boxOf(equals.contours);
  const centre = (left + right) / 2;
  const [half, reach, wide] = [270, 130, stroke * 0.56];
  return polygon(
    [centre - reach - wide, axis - half],
    [centre + reach - wide, axis + half],
    [centre + reach + wide, axis + half],
    [centre - reach + wide, axis - half],
  );
};

const root = (stroke) => {
  const thin = stroke * 0.95;
  return polygon(
    [20, 372],
    [20, 372 + stroke],
    [178, 372 + stroke],
    [282, 150],
    [505, 800],
    [600, 800],
    [600, 800 - stroke * 0.02],
    [505 + thin, 800],
    [282 + thin * 0.55, -60],
    [282 - thin * 0.75, -60],
    [178 - thin * 0.5, 372],
  );
};

/** A ring of circles' quadratic arcs, wide outside and hollow inside. */
const ring = (cx, cy, rx, ry, stroke) => [arcs(cx, cy, rx, ry, 1), arcs(cx, cy, rx - stroke, ry - stroke, -1)];

const arcs = (cx, cy, rx, ry, turn) => {
  const steps = 8;
  const points = [];
  for (let i = 0; i < 2 * steps; i++) {
    const angle = (-turn * i * Math.PI) / steps;
    const on = i % 2 === 0;
    const far = on ? 1 : 1 / Math.cos(Math.PI / steps);
    points.push({ x: Math.round(cx + rx * far * Math.cos(angle)), y: Math.round(cy + ry * far * Math.sin(angle)), on });
  }
  return points;
};

const infinity = (axis, stroke) => [...ring(245, axis, 205, 165, stroke), ...ring(575, axis, 205, 165, stroke)];

const diameter = (stroke) => {
  const wide = stroke * 0.5;
  return [
    ...ring(360, 340, 290, 290, stroke),
    polygon([70 - wide, 50 + wide], [650 - wide, 630 + wide], [650 + wide, 630 - wide], [70 + wide, 50 - wide]),
  ];
};

const tick = (stroke) => {
  const w = stroke * 1.1;
  return polygon(
    [60, 330],
    [60 + w * 0.75, 330 + w * 0.75],
    [240, 150 + w * 0.9],
    [520, 640],
    [520 + w * 0.95, 640 - w * 0.5],
    [258, 40],
  );
};

const frame = (stroke) => {
  const thin = stroke * 0.7;
  const box = (inset) => [
    [80 + inset, 40 + inset],
    [80 + inset, 560 - inset],
    [560 - inset, 560 - inset],
    [560 - inset, 40 + inset],
  ];
  return [polygon(...box(0)), polygon(...box(thin).reverse())];
};

/** The upward arrow laid down, its shaft on the axis of the minus sign. */
const turned = (up, turn, axis) => {
  const { left, right, bottom, top } = boxOf(up.contours);
  const laid = moved(up.contours, { a: 0, b: turn, c: -turn, d: 0 });
  const box = boxOf(laid);
  const side = 50;
  return [
    top - bottom + 2 * side,
    moved(laid, { dx: side - box.left, dy: Math.round(axis - (box.top + box.bottom) / 2 + 0 * (left + right)) }),
  ];
};

/** Raised digits stand as high as the face's own raised one. */
const superscripts = (put, glyph, numerator, slant, digits) => {
  const lift = boxOf(glyph('¹').contours).bottom - boxOf(numerator('1').contours).bottom;
  for (const digit of digits) {
    const character = '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(digit)];
    if ('¹²³'.includes(character)) continue;
    const { advance, contours } = numerator(digit);
    put(character, advance, moved(contours, { dy: lift, dx: slant * lift }));
  }
};

const eighths = (top, numerator, denominator, glyph) => {
  const parts = [numerator(top), glyph('⁄'), denominator('8')];
  let x = 0;
  const contours = parts.flatMap((part) => {
    const placed = moved(part.contours, { dx: x });
    x += part.advance;
    return placed;
  });
  return [x, contours];
};
