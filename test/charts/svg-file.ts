import { PAD } from '$lib/charts/plot-frame.svelte';

/** The drawings of a rendered page as one SVG file that stays the same until a picture changes. */
export function svgFile(body: string): string {
  const drawings = body.match(/<svg[\s\S]*?<\/svg>/g) ?? [];
  if (drawings.length === 0) throw new Error('nothing was drawn');
  let top = 0;
  let width = 0;
  const placed = drawings.map((drawing, i) => {
    const [w, h] = [sizeOf(drawing, 'width'), sizeOf(drawing, 'height')];
    const at = top;
    // The axis row stands close under the last panel, as on the page.
    top += h + (i === drawings.length - 2 ? -PAD : GAP);
    width = Math.max(width, w);
    return drawing.replace('<svg', `<svg y="${at}"`);
  });
  // The page's own tokens colour the file when a browser opens it.
  const svg = `<?xml-stylesheet href="../../../src/app.css"?>\n<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${top}" font-family="var(--font)" style="background: var(--paper)">\n${placed.join('\n')}\n</svg>\n`;
  return tidy(svg);
}

const GAP = 20;

function sizeOf(drawing: string, name: string): number {
  const found = new RegExp(` ${name}="([\\d.]+)"`).exec(drawing)?.[1];
  if (found === undefined) throw new Error(`a drawing without ${name}`);
  return Number(found);
}

/** Numbers to three decimals, no marks of the compiler, one element a line. */
function tidy(svg: string): string {
  return svg
    .replace(/<!--[\s\S]*?-->/g, '')
    .replace(/ ?svelte-[a-z0-9]+/g, '')
    .replace(/ class=""/g, '')
    .replace(/-?\d+\.\d{4,}/g, (digits) => String(Number(Number(digits).toFixed(3))))
    .replace(/></g, '>\n<');
}
