import { StyleSheet, Text as NativeText } from 'react-native';

import { webStyle } from '@/components/theme/web-style';

/** "h_cv" with its index set below: for equations, inside a Text. */
export function Symbols({ children }: { children: string }) {
  return children.split(/_([\p{L}\d,]+)/u).map((part, index) =>
    index % 2 === 1 ? (
      <NativeText key={`${index} ${part}`} style={styles.index}>
        {part}
      </NativeText>
    ) : (
      part
    ),
  );
}

const styles = StyleSheet.create({ index: webStyle({ fontSize: '0.75em', verticalAlign: 'sub', lineHeight: 0 }) });
