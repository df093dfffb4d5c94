import { ChakraProvider } from '@chakra-ui/react';
import { render, screen } from '@testing-library/react';
import { system } from '../../../theme/system';
import { NoteText } from './NoteText';

const show = (body: string) =>
  render(
    <ChakraProvider value={system}>
      <NoteText body={body} />
    </ChakraProvider>,
  ).container;

describe('a note’s text', () => {
  it('shows paragraphs, heavy and stressed words, and lists', () => {
    show('Play **softer**, _please_:\n\n- kick\n- snare');
    expect(screen.getByText('softer').tagName).toBe('STRONG');
    expect(screen.getByText('please').tagName).toBe('EM');
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual(['kick', 'snare']);
  });

  it('links to pages, tells search engines nothing, and says where hidden addresses lead', () => {
    show('[the manual](https://example.org/m) and https://example.org/n');
    const [hidden, bare] = screen.getAllByRole('link');
    expect(hidden).toHaveAttribute('href', 'https://example.org/m');
    expect(hidden).toHaveAttribute('rel', 'nofollow noopener noreferrer');
    expect(hidden.nextSibling).toHaveTextContent('(example.org)');
    expect(bare.nextSibling).toBeNull();
  });

  it.each([
    '<img src=x onerror="alert(1)">',
    '<script>alert(1)</script>',
    '[x](javascript:alert(1))',
    '<a href="https://example.org">x</a>',
    '<svg/onload=alert(1)>',
  ])('makes no element of %s', (body) => {
    const shown = show(body);
    expect(shown).toHaveTextContent(body);
    expect(shown.querySelector('img, script, svg, [onerror], a[href^="javascript"]')).toBeNull();
  });
});
