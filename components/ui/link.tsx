import { Link as RouterLink, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { fontFamily, touchTarget, type, weight, type ColourName, type TypeSize } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { buttonShape, toneStyle, type ButtonTone } from './button';

export type LinkProps = {
  label: string;
  href: Href;
  size?: TypeSize;
  tone?: ColourName;
  strong?: boolean;
  /** inside a sentence: only as high as its line */
  inline?: boolean;
};

export function Link({ label, href, size = 'body', tone = 'oxide', strong = false, inline = false }: LinkProps) {
  const theme = useTheme();
  const text = [styles.link, type[size], { color: theme[tone] }, strong && styles.strong, !inline && styles.alone];
  return (
    <RouterLink href={href} style={text}>
      {label}
    </RouterLink>
  );
}

/** Goes somewhere, and is the thing to do here. */
export function LinkButton({
  label,
  href,
  tone = 'quiet',
  full = false,
}: {
  label: string;
  href: Href;
  tone?: ButtonTone;
  full?: boolean;
}) {
  const theme = useTheme();
  return (
    <RouterLink href={href} style={[buttonShape.button, toneStyle(theme, tone), full && styles.full]}>
      {label}
    </RouterLink>
  );
}

type LinkAreaProps = {
  /** what the whole area is called; left out, its own words name it */
  label?: string;
  href: Href;
  /** the place we are at */
  current?: boolean;
  children: ReactNode;
};

/** A card or a row of which every spot leads to the same place. */
export function LinkArea({ label, href, current, children }: LinkAreaProps) {
  return (
    <RouterLink href={href} asChild aria-label={label} aria-current={current ? 'page' : undefined}>
      <View style={styles.area}>{children}</View>
    </RouterLink>
  );
}

const styles = StyleSheet.create({
  link: webStyle({ fontFamily, textDecorationLine: 'underline', textDecorationThickness: 1, textUnderlineOffset: 3 }),
  strong: { fontWeight: weight.strong },
  alone: webStyle({ display: 'inline-flex', alignItems: 'center', minHeight: touchTarget }),
  full: { alignSelf: 'stretch', flexGrow: 1 },
  area: webStyle({ textDecorationLine: 'none', minHeight: touchTarget, justifyContent: 'center' }),
});
