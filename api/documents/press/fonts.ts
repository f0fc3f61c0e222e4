import path from 'node:path';

import type { FontName } from './ink';

const folder = path.dirname(require.resolve('@expo-google-fonts/source-sans-3/package.json'));

/** The whole TTFs; pdfkit embeds only the glyphs that a document uses. */
export const fontFiles: Record<FontName, string> = {
  regular: path.join(folder, '400Regular/SourceSans3_400Regular.ttf'),
  semibold: path.join(folder, '600SemiBold/SourceSans3_600SemiBold.ttf'),
  bold: path.join(folder, '700Bold/SourceSans3_700Bold.ttf'),
};
