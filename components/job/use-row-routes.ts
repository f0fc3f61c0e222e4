import { useRouter, useSegments, type Href } from 'expo-router';

import { useLayout } from '@/components/theme/use-layout';
import { useToast } from '@/components/ui/toast';

type RowRoutes = { list: Href; one: (id: string) => Href };

/** Where saving and deleting a row of a list lead: beside the list it stays open, alone it goes back to the list. */
export function useRowRoutes({ list, one }: RowRoutes) {
  const router = useRouter();
  const toast = useToast();
  const { isSplit } = useLayout();
  return {
    created: (id: string, text: string) => {
      toast({ text });
      router.replace(isSplit ? one(id) : list);
    },
    changed: (text: string) => toast({ text }),
    gone: () => router.replace(list),
    cancel: () => router.replace(list),
  };
}

/** Whether one row of a list is open, by the address: the list alone is its last part. */
export function useIsOpen(noun: string): boolean {
  return useSegments().at(-1) !== noun;
}
