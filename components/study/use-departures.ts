import type { Override, Run } from '@/api/contracts/run';
import { useToast } from '@/components/ui/toast';
import { useSaveOverride } from '@/hooks/use-study';

/** Returns a function that writes a departure, says so, and offers the way back. */
export function useDepartures(jobId: string) {
  const save = useSaveOverride(jobId);
  const toast = useToast();
  return async (run: Run, override: Override | null, said: string): Promise<void> => {
    const saved = await save(run, override);
    const undo = () =>
      save(saved, run.override).then(
        () => toast({ text: `${run.number} is as it was.` }),
        () => toast({ text: `${run.number} was changed again meanwhile: it stays as it is now.` }),
      );
    toast({ text: said, action: { label: 'Undo', onPress: () => void undo() } });
  };
}
