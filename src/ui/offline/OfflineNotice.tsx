import { useEffect, useState } from 'react';
import { registerOffline } from './register.ts';

/** Keeps the offline copy and tells when a newer version lies ready or none can be kept. */
export function OfflineNotice() {
  const [takeOver, setTakeOver] = useState<(() => void) | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  useEffect(() => {
    registerOffline({
      onNewVersion: (begin) => { setTakeOver(() => begin); },
      onTrouble: (what) => { setTrouble(what.kind === 'refused' ? what.reason : what.kind); },
    });
  }, []);
  if (takeOver !== null) {
    return (
      <div className="notice" role="status">
        <span>A newer version of the program is ready. Nothing typed is lost.</span>
        <button type="button" className="plain" onClick={takeOver}>Use it now</button>
      </div>
    );
  }
  if (trouble === null) return null;
  return (
    <div className="notice" role="status">
      <span>The program cannot be kept for work without a network: {trouble}.</span>
      <button type="button" className="plain" onClick={() => { setTrouble(null); }}>Dismiss</button>
    </div>
  );
}
