import type { ComponentPropsWithRef, JSX } from 'react';
import type { StyleProp, TextStyle, ViewStyle } from 'react-native';
import { unstable_createElement } from 'react-native-web';

type Tag = keyof JSX.IntrinsicElements;
export type ElementProps<T extends Tag> = Omit<ComponentPropsWithRef<T>, 'style' | 'className'> & {
  tag: T;
  style?: StyleProp<TextStyle | ViewStyle>;
};

/** An element of the page itself (form, input, select, table), where the browser's own behaviour is the better one; styled like the rest of the kit. */
export const Element = <T extends Tag>({ tag, ...props }: ElementProps<T>) => unstable_createElement(tag, props);
