/** A value that can be watched: what React's useSyncExternalStore and plain code both read. */
export class Observable<T> {
  #value: T;
  readonly #watchers = new Set<() => void>();

  constructor(value: T) {
    this.#value = value;
  }

  readonly get = (): T => this.#value;

  readonly set = (value: T): void => {
    if (Object.is(value, this.#value)) return;
    this.#value = value;
    for (const watcher of [...this.#watchers]) watcher();
  };

  readonly watch = (watcher: () => void): (() => void) => {
    this.#watchers.add(watcher);
    return () => this.#watchers.delete(watcher);
  };
}
