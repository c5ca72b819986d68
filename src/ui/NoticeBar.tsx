import { noticeSentence } from '../state/index.ts';
import { useActions, useWorkspaceState } from './bindings/workspace.tsx';

/** The last thing worth telling, with its way back where there is one. */
export function NoticeBar() {
  const notice = useWorkspaceState((state) => state.notice);
  const actions = useActions();
  if (notice === null) return null;
  return (
    <div className="notice" role="status">
      <span>{noticeSentence(notice)}</span>
      {notice.kind === 'deleted' && <button type="button" className="plain" onClick={() => { actions.restoreDeleted(notice.id); }}>Bring it back</button>}
      <button type="button" className="plain" onClick={() => { actions.dismissNotice(); }}>Dismiss</button>
    </div>
  );
}
