import { withPreview } from './share-page';

const page = '<html><head><title>Thudline</title>\n<link rel="icon"></head><body></body></html>';

describe('the head of a share page', () => {
  it('holds title and verdict, and a title of its own in place of the page’s', () => {
    const html = withPreview(page, { title: 'Second try', verdict: 'Flip the overhead.' });
    expect(html).toContain('<title>Second try · Thudline</title>');
    expect(html).toContain('<meta property="og:title" content="Second try">');
    expect(html).toContain('<meta property="og:description" content="Flip the overhead.">');
    expect(html.match(/<title>/g)).toHaveLength(1);
    expect(html).toContain('<link rel="icon">');
  });

  it('stays text, whatever a player writes as title', () => {
    const html = withPreview(page, { title: `"><script>alert(1)</script> $& $1 '`, verdict: '' });
    expect(html).not.toContain('<script>');
    expect(html).toContain('&quot;&gt;&lt;script&gt;alert(1)&lt;/script&gt; $&amp; $1 &#39;');
    expect(html).not.toContain('og:description');
  });
});
