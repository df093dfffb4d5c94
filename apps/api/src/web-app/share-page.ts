import { SharePreview } from '../shares/share-preview.service';

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escaped = (text: string) => text.replace(/[&<>"']/g, (letter) => entities[letter] ?? letter);

/** Title and verdict in the page's head, and nothing else of the take. */
export function withPreview(page: string, { title, verdict }: SharePreview): string {
  const tags = [
    `<title>${escaped(title)} · Thudline</title>`,
    `<meta property="og:site_name" content="Thudline">`,
    `<meta property="og:title" content="${escaped(title)}">`,
    ...(verdict ? [`<meta property="og:description" content="${escaped(verdict)}">`] : []),
    `<meta name="robots" content="noindex, nofollow">`,
  ];
  const rest = page.replace(/<title>.*?<\/title>\s*/s, '');
  // A function, so that a dollar sign in a title stays one.
  return rest.replace('</head>', () => `${tags.join('\n    ')}\n  </head>`);
}
