import { useEffect } from 'react';
import { useWords } from './use-words';

/** Names the tab after the page: "F-12, Fairlead". */
export function usePageTitle(title: string | undefined): void {
  const { say } = useWords();
  const product = say('app.name');
  useEffect(() => {
    document.title = title ? `${title}, ${product}` : product;
  }, [title, product]);
}
