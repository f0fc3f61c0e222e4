import { Text } from '@/components/ui/text';

import { confidenceText } from './library-words';

type SourceLineProps = { source: string; confidence?: string; of?: string };

/** Where a row comes from and how sure it is. */
export function SourceLine({ source, confidence, of }: SourceLineProps) {
  const about = of ? `${of}: ` : 'Source: ';
  return (
    <Text size="small" tone="inkSoft">
      {`${about}${source}.`}
      {confidence ? ` Confidence: ${confidenceText(confidence)}.` : ''}
    </Text>
  );
}
