/** Elements of HTML that have no end tag. */
const VOID = new Set(['meta', 'br', 'link', 'img', 'hr', 'input']);
const TAG = /^<(\/?)([a-zA-Z][a-zA-Z0-9]*)((?:\s+[a-zA-Z_:][a-zA-Z0-9_:.-]*="[^"<]*")*)\s*(\/?)>/;
const ENTITY = /&(?!(?:amp|lt|gt|quot|#39|#160);)/;

/** What a strict reader finds wrong with a page: tags that do not nest, attributes without quotes, stray signs; "" for nothing. */
export const markupProblem = (page: string): string => {
  if (!page.startsWith('<!DOCTYPE html>\n')) return 'no document type';
  let rest = page.slice('<!DOCTYPE html>\n'.length);
  const open: string[] = [];
  const ids = new Set<string>();
  while (rest !== '') {
    const next = rest.indexOf('<');
    const text = next < 0 ? rest : rest.slice(0, next);
    if (open.at(-1) !== 'style' && (ENTITY.test(text) || text.includes('>'))) return `stray sign: ${text.slice(0, 80)}`;
    if (next < 0) break;
    rest = rest.slice(next);
    const found = TAG.exec(rest);
    if (found === null) return `no tag: ${rest.slice(0, 80)}`;
    const [whole, end, name = '', attributes = '', closed] = found;
    if (ENTITY.test(attributes)) return `stray sign in ${whole}`;
    for (const [, id = ''] of attributes.matchAll(/\sid="([^"]*)"/g)) {
      if (ids.has(id)) return `the id ${id} stands twice`;
      ids.add(id);
    }
    if (end === '/') {
      const last = open.pop();
      if (last !== name) return `</${name}> closes <${String(last)}>`;
    } else if (closed !== '/' && !VOID.has(name)) open.push(name);
    rest = rest.slice(whole.length);
  }
  return open.length === 0 ? '' : `never closed: ${open.join(', ')}`;
};

/** Every element and attribute name of a page that could run or fetch something. */
export const activeParts = (page: string): readonly string[] =>
  [...page.matchAll(/<(?:script|link|iframe|object|embed|img|base|form|input|use|image|foreignObject)\b/gi)]
    .map(String)
    .concat(
      [...page.matchAll(/<[^>]*\s(on[a-z]+|src|srcset|action|formaction|xlink:href)=/gi)].map(String),
      [...page.matchAll(/<[^>]*\shref="(?!#)[^"]*"/gi)].map(String),
      [...page.matchAll(/@import|url\((?!#)|expression\(|https?:\/\//gi)].map(String),
    );
