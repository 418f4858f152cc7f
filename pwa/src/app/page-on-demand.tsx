import { useEffect, useState, type ComponentType } from 'react';

type LoadPage = () => Promise<ComponentType>;

/** A page whose code comes when it is first shown, or earlier by `preload`. */
export type PageOnDemand = ComponentType & { readonly preload: () => Promise<void> };

/**
 * Wraps a loader. Not `React.lazy`: React holds back what follows a Suspense fallback for 300 ms, even where the code
 * is already on the phone; a tab would answer a third of a second late. A page that is loaded is drawn at once, and a
 * failed load is thrown into the boundary around the page.
 */
export function pageOnDemand(load: LoadPage): PageOnDemand {
  let loaded: ComponentType | null = null;
  const fetchPage = async (): Promise<ComponentType> => (loaded ??= await load());

  function Page() {
    const [Content, setContent] = useState<ComponentType | null>(() => loaded);
    const [failure, setFailure] = useState<{ readonly error: unknown } | null>(null);
    useEffect(() => {
      if (Content) return;
      let isWanted = true;
      fetchPage().then(
        (page) => isWanted && setContent(() => page),
        (error: unknown) => isWanted && setFailure({ error }),
      );
      return () => {
        isWanted = false;
      };
    }, [Content]);
    if (failure) throw failure.error;
    return Content ? <Content /> : null;
  }
  return Object.assign(Page, { preload: async () => void (await fetchPage()) });
}
