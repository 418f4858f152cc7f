import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { NoticeLine } from '../../design/notice/NoticeLine';
import { anyUnsavedWork } from '../../platform/unsaved-work';
import { sectionOf } from '../../platform/paths';
import { applyUpdate, useUpdateReady } from './worker';

/**
 * "A new version is ready", between the page and the tabs, so that it covers no form's own keys. Not in Field, where
 * the thumb is busy and nothing may move: there it waits for the next moment when the phone is put away.
 */
export function UpdateLine() {
  const isReady = useUpdateReady();
  const [isPutOff, setPutOff] = useState(false);
  const [mustSave, setMustSave] = useState(false);
  const isInField = sectionOf(useLocation().pathname) === 'field';
  const take = (): void => {
    if (anyUnsavedWork()) setMustSave(true);
    else applyUpdate();
  };
  const text = mustSave
    ? 'A new version is ready. Save or leave the open form first; then it comes by itself.'
    : 'A new version is ready.';
  return (
    <div className="shell-update">
      <NoticeLine
        text={isReady && !isPutOff && !isInField ? text : null}
        actionLabel="Use it now"
        onAction={take}
        onDismiss={() => setPutOff(true)}
      />
    </div>
  );
}
