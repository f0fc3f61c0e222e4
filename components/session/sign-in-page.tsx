import { StyleSheet, View } from 'react-native';

import type { SignIn } from '@/api/contracts/session';
import { hairline, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Brand } from '@/components/shell/brand';
import { Heading } from '@/components/ui/heading';
import { Main } from '@/components/ui/main';
import { Text } from '@/components/ui/text';
import { useTitle } from '@/components/ui/use-title';

import { CutPipe } from './cut-pipe';
import { SignInForm } from './sign-in-form';

/** The first page: the form, and beside it what all this is about. */
export function SignInPage({ onSignIn }: { onSignIn: (input: SignIn) => Promise<unknown> }) {
  const { isPhone } = useLayout();
  useTitle('Sign in');
  return (
    <Main>
      <View style={[styles.page, isPhone ? styles.phone : styles.wide]}>
        <View style={isPhone ? styles.top : styles.left}>
          <Brand size={28} />
          <View style={styles.form}>
            <View style={styles.words}>
              <Heading level={1}>Sign in</Heading>
              <Text tone="inkSoft">Thickness, takeoff and the document that your client reads.</Text>
            </View>
            <SignInForm onSignIn={onSignIn} focused={!isPhone} />
          </View>
        </View>
        {isPhone ? <Below /> : <Beside />}
      </View>
    </Main>
  );
}

function Beside() {
  const theme = useTheme();
  return (
    <View style={[styles.beside, { borderLeftColor: theme.rule }]}>
      <CutPipe size={720} />
    </View>
  );
}

/** What room a phone leaves, with the upper edge of the same drawing. */
const Below = () => (
  <View style={styles.below}>
    <CutPipe size={560} />
  </View>
);

const styles = StyleSheet.create({
  page: webStyle({ flex: 1, minHeight: '100%', overflowY: 'auto' }),
  phone: { flexDirection: 'column', paddingHorizontal: space.md, paddingTop: space.lg },
  wide: { flexDirection: 'row' },
  top: { gap: space.xxl, flexShrink: 0 },
  left: webStyle({
    width: 'min(50%, 560px)',
    padding: space.xl,
    gap: space.xl,
    boxSizing: 'border-box',
    minHeight: '100%',
  }),
  form: webStyle({
    gap: space.lg,
    maxWidth: 380,
    width: '100%',
    marginTop: 'auto',
    marginBottom: 'auto',
    alignSelf: 'center',
  }),
  words: { gap: space.xxs },
  beside: webStyle({
    flex: 1,
    overflow: 'hidden',
    justifyContent: 'center',
    alignItems: 'flex-start',
    paddingLeft: space.xxl,
    borderLeftWidth: hairline,
    borderLeftStyle: 'solid',
  }),
  below: webStyle({
    flex: 1,
    minHeight: 0,
    overflow: 'hidden',
    alignItems: 'center',
    marginTop: space.xxl,
    marginLeft: -space.md,
    marginRight: -space.md,
  }),
});
