import { useTheme } from '@/components/theme/use-theme';
import { buttonShape, toneStyle } from '@/components/ui/button';
import { Element } from '@/components/ui/element';

/** Opens a PDF from the server in a tab of its own. */
export function PdfLink({ path, label, download }: { path: string; label: string; download?: boolean }) {
  const theme = useTheme();
  return (
    <Element
      tag="a"
      href={`/api${path}`}
      target={download ? undefined : '_blank'}
      rel="noreferrer"
      download={download || undefined}
      style={[buttonShape.button, toneStyle(theme, 'quiet')]}
    >
      {label}
    </Element>
  );
}
