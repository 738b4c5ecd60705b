import { useEffect } from 'react';
import { NavigationType, useLocation, useNavigationType } from 'react-router-dom';

/** A new page starts at its top; going back stays where the browser puts it. */
export function ScrollToTop() {
  const { pathname, hash } = useLocation();
  const how = useNavigationType();
  useEffect(() => {
    if (how !== NavigationType.Pop && hash === '') window.scrollTo(0, 0);
  }, [pathname, hash, how]);
  return null;
}
