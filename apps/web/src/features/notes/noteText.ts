/** What a note's text is made of. There is no HTML in it, whatever somebody writes: these become elements, never markup. */
export type Inline =
  | { kind: 'text'; text: string }
  | { kind: 'strong' | 'emphasis'; children: Inline[] }
  | { kind: 'link'; url: string; text: string };

export type Block =
  { kind: 'paragraph'; lines: Inline[][] } | { kind: 'list'; ordered: boolean; items: Inline[][] };

const bullet = /^\s*[-*•]\s+(?=\S)/;
const counted = /^\s*\d{1,3}[.)]\s+(?=\S)/;

/**
 * Reads a note: blank lines part paragraphs, lines that begin with `-` or `1.` are lists, `**heavy**`, `*stressed*` or
 * `_stressed_`, `[words](https://…)` and bare addresses are links. Whatever doesn't close, or leads to no page, stays as
 * it was written.
 */
export function noteBlocks(body: string): Block[] {
  const blocks: Block[] = [];
  let before = '';
  for (const line of body.split('\n')) {
    if (line.trim() !== '') addLine(blocks, line, before.trim() === '');
    before = line;
  }
  return blocks;
}

function addLine(blocks: Block[], line: string, begins: boolean): void {
  const last = blocks.at(-1);
  const mark = bullet.exec(line) ?? counted.exec(line);
  if (mark) {
    const ordered = counted.test(line);
    const item = noteInlines(line.slice(mark[0].length));
    if (last?.kind === 'list' && last.ordered === ordered) last.items.push(item);
    else blocks.push({ kind: 'list', ordered, items: [item] });
    return;
  }
  const words = noteInlines(line.trim());
  if (last?.kind === 'paragraph' && !begins) last.lines.push(words);
  else blocks.push({ kind: 'paragraph', lines: [words] });
}

const patterns: { find: RegExp; read: (found: RegExpExecArray) => Inline | null }[] = [
  {
    find: /\[([^[\]\n]{1,200})\]\(([^()\s]{1,500})\)/,
    read: ([, text = '', url = '']) => link(url, text),
  },
  { find: /https?:\/\/[^\s<>"'*]*[^\s<>"'*.,;:!?)\]}]/i, read: ([url]) => link(url, url) },
  {
    find: /\*\*(?=\S)([^*]+?)(?<=\S)\*\*/,
    read: ([, text = '']) => ({ kind: 'strong', children: noteInlines(text) }),
  },
  {
    find: /(?<![\p{L}\p{N}*])\*(?=[^\s*])([^*]+?)(?<=\S)\*(?![\p{L}\p{N}*])/u,
    read: ([, text = '']) => ({ kind: 'emphasis', children: noteInlines(text) }),
  },
  {
    find: /(?<![\p{L}\p{N}_])_(?=[^\s_])([^_]+?)(?<=\S)_(?![\p{L}\p{N}_])/u,
    read: ([, text = '']) => ({ kind: 'emphasis', children: noteInlines(text) }),
  },
];

export function noteInlines(text: string): Inline[] {
  const inlines: Inline[] = [];
  let rest = text;
  while (rest !== '') {
    const next = earliest(rest);
    if (!next) break;
    if (next.start > 0) inlines.push({ kind: 'text', text: rest.slice(0, next.start) });
    inlines.push(next.inline);
    rest = rest.slice(next.end);
  }
  return rest === '' ? inlines : [...inlines, { kind: 'text', text: rest }];
}

interface Found {
  start: number;
  end: number;
  inline: Inline;
}

function earliest(text: string): Found | null {
  return patterns.reduce<Found | null>((best, { find, read }) => {
    const found = find.exec(text);
    const inline = found && (!best || found.index < best.start) ? read(found) : null;
    return found && inline ? { start: found.index, end: found.index + found[0].length, inline } : best;
  }, null);
}

/** Only pages of the web; no scripts, no data, no addresses with a name and password in them. */
function link(address: string, text: string): Inline | null {
  const url = parsedUrl(address);
  if (!url || !['http:', 'https:'].includes(url.protocol) || url.username || url.password) return null;
  return { kind: 'link', url: url.href, text };
}

function parsedUrl(address: string): URL | null {
  try {
    return new URL(address);
  } catch {
    return null;
  }
}
