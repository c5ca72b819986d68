import { useEffect } from 'react';
import { useActions } from './bindings/workspace.tsx';

/**
 * Ctrl+Z and Ctrl+Shift+Z (or Ctrl+Y) undo and redo on the recipe everywhere,
 * also inside a field: what is typed is already in the recipe, so the browser's
 * own undo of a field would only disagree with it.
 */
export function useUndoKeys(): void {
  const actions = useActions();
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if (key === 'z' && !event.shiftKey) actions.undo();
      else if (key === 'y' || (key === 'z' && event.shiftKey)) actions.redo();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => { window.removeEventListener('keydown', onKey); };
  }, [actions]);
}
