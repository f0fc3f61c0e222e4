/**
 * The page's policy lets no style attribute through, and a frame inside of it is under the same policy. The mail's
 * own styles become rules of a style sheet, which it does let through; the mail itself goes out as it is.
 */
export function withStyleSheet(html: string): string {
  const styles: string[] = [];
  const body = html.replace(/ style="([^"]*)"/g, (_attribute, style: string) => {
    const known = styles.indexOf(style);
    return ` class="s${known < 0 ? styles.push(style) - 1 : known}"`;
  });
  const rules = styles.map((style, index) => `.s${index}{${plain(style)}}`).join('');
  return body.replace('</head>', `<style>${rules}</style></head>`);
}

/** In a style sheet nothing is escaped. */
const plain = (style: string) => style.replaceAll('&quot;', '"').replaceAll('&#39;', "'").replaceAll('&amp;', '&');
