import { Slot, type ErrorBoundaryProps } from 'expo-router';
import { SWRConfig } from 'swr';

import { ThemeProvider } from '@/components/theme/theme-provider';
import { Crash } from '@/components/ui/crash';
import { Page } from '@/components/ui/page';
import { SkipLink } from '@/components/ui/skip-link';
import { ToastProvider } from '@/components/ui/toast';
import { swrSettings } from '@/hooks/swr-settings';
import { useAppearance } from '@/hooks/use-appearance';

export default function RootLayout() {
  const { appearance } = useAppearance();
  return (
    <SWRConfig value={swrSettings}>
      <ThemeProvider appearance={appearance}>
        <Page>
          <ToastProvider>
            <SkipLink />
            <Slot />
          </ToastProvider>
        </Page>
      </ThemeProvider>
    </SWRConfig>
  );
}

/** What Expo Router shows when a screen throws. */
export function ErrorBoundary({ error, retry }: ErrorBoundaryProps) {
  return <Crash message={error.message} onRetry={() => void retry()} />;
}
