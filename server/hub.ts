import { EventEmitter } from 'node:events';

/** News inside this process, by topic; what must reach other processes goes through the database. */
export interface Hub {
  publish(topic: string, event: unknown): void;
  /** Returns the way to stop listening. */
  subscribe(topic: string, listener: (event: unknown) => void): () => void;
}

/** A hub on Node's own event emitter, without a limit of listeners. */
export function createHub(): Hub {
  const emitter = new EventEmitter();
  emitter.setMaxListeners(0);
  const named = (topic: string) => `topic:${topic}`;
  return {
    publish: (topic, event) => void emitter.emit(named(topic), event),
    subscribe(topic, listener) {
      emitter.on(named(topic), listener);
      return () => void emitter.off(named(topic), listener);
    },
  };
}
