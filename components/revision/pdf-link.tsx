import { useTheme } from '@/components/theme/use-theme';
import { buttonShape, toneStyle, type ButtonTone } from '@/components/ui/button';
import { Element } from '@/components/ui/element';

type PdfLinkProps = { path: string; label: string; tone?: ButtonTone; download?: boolean };

/** Opens a PDF from the server in a tab of its own, or saves it. */
export function PdfLink({ path, label, tone = 'quiet', download }: PdfLinkProps) {
  const theme = useTheme();
  return (
    <Element
      tag="a"
      href={`/api${path}`}
      target={download ? undefined : '_blank'}
      rel="noreferrer"
      download={download || undefined}
      style={[buttonShape.button, toneStyle(theme, tone)]}
    >
      {label}
    </Element>
  );
}
