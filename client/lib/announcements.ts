type Listener = (words: string) => void;
const listeners = new Set<Listener>();

/** Says something to people who use a screen reader, without moving their focus. */
export function announce(words: string): void {
  for (const listener of listeners) listener(words);
}

export function onAnnounce(listener: Listener): () => void {
  listeners.add(listener);
  return () => {
    listeners.delete(listener);
  };
}
