/** An error as the platform throws it. */
export class FakeExcelError extends Error {
  constructor(
    readonly code: string,
    message = code,
  ) {
    super(message);
    this.name = 'RichApi.Error';
  }
}

export interface Property<T> {
  readonly get: (target: T) => unknown;
  readonly set?: (target: T, value: unknown) => void;
}

export interface ClientSpec<T> {
  /** The kind of object, for messages. */
  readonly type: string;
  /** Finds the thing in the workbook when the queue runs; null only for `…OrNullObject`. */
  readonly resolve: () => T | null;
  readonly properties: Readonly<Record<string, Property<T>>>;
  /** Methods, children and events: `self` gives the thing when the queue runs. */
  readonly members?: Readonly<Record<string, unknown>>;
  /** Collections: the children that `items/…` loads. */
  readonly items?: (target: T) => object[];
}

const ALWAYS = new Set(['then', 'toJSON', 'constructor', '$$typeof', 'asymmetricMatch']);

/** One request context: commands queue up and run, in order, at `sync`. */
export class FakeContext {
  syncs = 0;
  private queue: (() => void)[] = [];

  push(command: () => void): void {
    this.queue.push(command);
  }

  sync(): Promise<void> {
    this.syncs += 1;
    const commands = this.queue;
    this.queue = [];
    return Promise.resolve().then(() => {
      for (const command of commands) command();
    });
  }

  /**
   * A proxy object as the platform makes them: a property is known only after `load` and `sync`,
   * anything that the fake does not have is an error, writes happen at `sync`.
   */
  object<T>(spec: ClientSpec<T>): unknown {
    const loaded = new Map<string, unknown>();
    let target: { readonly found: T | null } | undefined;
    let items: object[] | undefined;
    const find = () => (target ??= { found: spec.resolve() }).found;
    const need = () => {
      const found = find();
      if (found === null) throw new FakeExcelError('InvalidObjectPath', `${spec.type} is a null object`);
      return found;
    };
    this.push(() => {
      find();
    });

    const load = (names?: string | readonly string[]) => {
      const wanted = (typeof names === 'string' ? names.split(',') : (names ?? Object.keys(spec.properties))).map(
        (name) => name.trim(),
      );
      const own = wanted.filter((name) => !name.startsWith('items/'));
      const ofItems = wanted.flatMap((name) => (name.startsWith('items/') ? [name.slice('items/'.length)] : []));
      for (const name of own) {
        if (!(name in spec.properties)) throw new Error(`fake Excel: ${spec.type} has no property "${name}" to load`);
      }
      if (ofItems.length > 0 && spec.items === undefined) throw new Error(`fake Excel: ${spec.type} is no collection`);
      this.push(() => {
        const found = find();
        if (found === null) return;
        for (const name of own) loaded.set(name, structuredClone(spec.properties[name]?.get(found)));
        if (ofItems.length === 0 || spec.items === undefined) return;
        items = spec.items(found);
        for (const item of items) (item as { load: (names: string[]) => unknown }).load(ofItems);
        // The loads of the items have joined the queue; they belong to this command.
        const queued = this.queue;
        this.queue = [];
        for (const command of queued) command();
      });
      return proxy;
    };

    const proxy: unknown = new Proxy(
      {},
      {
        get: (_, name) => {
          if (typeof name === 'symbol' || ALWAYS.has(name)) return undefined;
          if (name === 'context') return this;
          if (name === 'load') return load;
          if (name === 'isNullObject') {
            if (target === undefined) throw new Error(`fake Excel: ${spec.type}.isNullObject was read before sync`);
            return target.found === null;
          }
          if (name === 'items') {
            if (items === undefined) throw new Error(`fake Excel: ${spec.type}.items was read before load and sync`);
            return items;
          }
          if (spec.members !== undefined && name in spec.members) return spec.members[name];
          if (!(name in spec.properties)) throw new Error(`fake Excel: ${spec.type} has no member "${name}"`);
          if (!loaded.has(name)) throw new Error(`fake Excel: ${spec.type}.${name} was read before load and sync`);
          return loaded.get(name);
        },
        set: (_, name, value) => {
          const set = typeof name === 'string' ? spec.properties[name]?.set : undefined;
          if (set === undefined) throw new Error(`fake Excel: ${spec.type}.${String(name)} cannot be set`);
          const copy: unknown = structuredClone(value);
          this.push(() => {
            set(need(), copy);
          });
          return true;
        },
      },
    );
    return proxy;
  }
}
