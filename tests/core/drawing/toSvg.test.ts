import { describe, expect, it } from 'vitest';
import { drawEnd } from '../../../core/drawing/drawEnd.ts';
import { failurePath } from '../../../core/drawing/failurePath.ts';
import { layoutDrawing } from '../../../core/drawing/layout.ts';
import { plainStyle, toSvg } from '../../../core/drawing/toSvg.ts';
import { sampleFacts, sampleWords } from './sampleFacts.ts';

const facts = sampleFacts();
const options = { values: 'gap', textHeight: 12.6 } as const;

describe('the drawing as SVG', () => {
  it('draws every mark at the given scale', () => {
    const laid = layoutDrawing(drawEnd(facts, sampleWords), options);
    const svg = toSvg(laid, { ...plainStyle, scale: 2 }, 'One end');
    const drawn = svg.match(/<(path|circle|text) /g) ?? [];
    expect(drawn).toHaveLength(laid.marks.length);
    expect(svg).toContain(`width="${Math.round((laid.box.right - laid.box.left) * 200) / 100}"`);
    expect(svg).toContain('<title>One end</title>');
    expect(svg).not.toMatch(/NaN|Infinity|undefined/);
    // The holes are 22 across: radius 11 mm, 22 px.
    expect(svg.match(/<circle [^>]*r="22"/g)).toHaveLength(3);
  });

  it('gives the way of failing the accent and the drawing the ink', () => {
    const drawing = drawEnd(facts, sampleWords);
    const bare = toSvg(layoutDrawing(drawing, options), plainStyle);
    const over = toSvg(layoutDrawing(drawing, options, failurePath('web-block', '', facts, sampleWords)), plainStyle);
    expect(bare).not.toContain(plainStyle.accent);
    expect(over).toContain(plainStyle.accent);
  });

  it('lets no name of the user break out of the text', () => {
    const words = { ...sampleWords, section: '<b>"&\'' };
    const svg = toSvg(layoutDrawing(drawEnd(facts, words), options), plainStyle, '</title><script>');
    expect(svg).not.toContain('<b>');
    expect(svg).not.toContain('<script>');
    expect(svg).toContain('&lt;b&gt;&quot;&amp;');
  });
});
