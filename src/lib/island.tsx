import { type ComponentType, lazy, Suspense, useId, useState } from "react";

/** Where an island's code comes from: a dynamic import, and what it brought once it has come. */
export interface IslandSource<Props> {
  load: () => Promise<ComponentType<Props>>;
  loaded: ComponentType<Props> | null;
}

const declared: (() => Promise<void>)[] = [];

/** Declares an island beside the dynamic import of its component. */
export function islandSource<Props>(load: () => Promise<ComponentType<Props>>): IslandSource<Props> {
  const source: IslandSource<Props> = { load, loaded: null };
  let loading: Promise<void> | null = null;
  declared.push(() => {
    loading ??= load().then((component) => {
      source.loaded = component;
    });
    return loading;
  });
  return source;
}

/**
 * Fetches the code of every island declared so far, so that the server can draw them whole: call it once the
 * page's own code has come. Requests at the same time wait for the same loading.
 */
export async function loadIslands(): Promise<void> {
  await Promise.all(declared.map((load) => load()));
}

/** Resolves once the element is on the screen or nearly so; at once when there is nothing to watch. */
function nearScreen(elementId: string): Promise<void> {
  const element = document.getElementById(elementId);
  if (!element) return Promise.resolve();
  return new Promise((resolve) => {
    const observer = new IntersectionObserver(
      (entries) => {
        if (!entries.some((entry) => entry.isIntersecting)) return;
        observer.disconnect();
        resolve();
      },
      { rootMargin: "200px" },
    );
    observer.observe(element);
  });
}

interface IslandProps<Props> {
  source: IslandSource<Props>;
  props: Props;
}

/**
 * A part of a page that is drawn on the server and comes alive in the browser only when it nears the
 * screen: its code is no part of the page's first load.
 */
export function Island<Props extends object>({ source, props }: IslandProps<Props>) {
  const id = useId();
  const [Part] = useState<ComponentType<Props>>(
    () => source.loaded ?? lazy(() => nearScreen(id).then(async () => ({ default: await source.load() }))),
  );
  return (
    <div id={id}>
      <Suspense fallback={null}>
        <Part {...props} />
      </Suspense>
    </div>
  );
}
