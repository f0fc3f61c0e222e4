import { StyleSheet, View } from 'react-native';

import { measure, space } from '@/components/theme/tokens';

import { ActionButton, type Action } from './action-button';
import { Heading } from './heading';
import { Text } from './text';

type EmptyStateProps = {
  /** what is not there yet: "No runs yet" */
  title: string;
  /** what to do next, and what follows from it */
  children: string;
  action?: Action;
};

export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <View style={styles.empty}>
      <Heading>{title}</Heading>
      <Text tone="inkSoft">{children}</Text>
      {action ? (
        <View style={styles.action}>
          <ActionButton action={action} />
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  empty: { paddingVertical: space.xl, gap: space.xs, maxWidth: measure, alignItems: 'flex-start' },
  action: { paddingTop: space.xs },
});
