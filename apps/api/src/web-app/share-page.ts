import { SharePreview } from '../shares/share-preview.service';
import { escapeHtml } from '../text/escape-html';

/** Title and verdict in the page's head, and nothing else of the take. */
export function withPreview(page: string, { title, verdict }: SharePreview): string {
  const tags = [
    `<title>${escapeHtml(title)} · Thudline</title>`,
    `<meta property="og:site_name" content="Thudline">`,
    `<meta property="og:title" content="${escapeHtml(title)}">`,
    ...(verdict ? [`<meta property="og:description" content="${escapeHtml(verdict)}">`] : []),
    `<meta name="robots" content="noindex, nofollow">`,
  ];
  const rest = page.replace(/<title>.*?<\/title>\s*/s, '');
  // A function, so that a dollar sign in a title stays one.
  return rest.replace('</head>', () => `${tags.join('\n    ')}\n  </head>`);
}
