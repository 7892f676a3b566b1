// What a reminder to look after a running hose says.
import type { WordOptions } from './options'
import { waterText } from './quantities'

export function fillReminder(
  { litres, isDone }: { litres: number; isDone: boolean },
  words: WordOptions,
): { sentence: string; progress: string } {
  if (isDone) {
    return {
      sentence: 'Turn the hose off: the water should be in.',
      progress: `By the flow you gave, ${waterText(litres, words)} are in. Measure the low corner before you finish.`,
    }
  }
  return {
    sentence: 'Look at hose and liner.',
    progress: `By the flow you gave, ${waterText(litres, words)} are in. Log the depth at the low corner while you are there.`,
  }
}
