import { withStyleSheet } from '@/components/revision/mail-frame';

it('turns style attributes into rules of the same words, each once', () => {
  const html =
    '<html><head><title>x</title></head><body style="a:b"><p style="c:\'d\'">1</p><p style="a:b">2</p></body></html>';
  expect(withStyleSheet(html)).toBe(
    "<html><head><title>x</title><style>.s0{a:b}.s1{c:'d'}</style></head>" +
      '<body class="s0"><p class="s1">1</p><p class="s0">2</p></body></html>',
  );
});

it('leaves what people wrote as it is', () => {
  const words = 'a style=&quot;x&quot; of its own';
  expect(withStyleSheet(`<html><head></head><body>${words}</body></html>`)).toContain(words);
});
