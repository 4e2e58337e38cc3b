import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useDraftOwner } from '../../../shared-ui/draft-owner';
import type { LevelBeingEntered } from '../../../shared-ui/level-diagram/level-point';
import { instrumentsQuery, type Build } from '../api/builds';
import { chosenOf } from './instrument-wait';
import { liveReading } from './live-reading';
import { prefillOf } from './prefill';
import { lastTypedLevel } from './reading-draft';

interface LevelOnDevice {
  /** As the diagram draws it; undefined while what is typed cannot be read. */
  entered: LevelBeingEntered | undefined;
  stageId: string;
  checkId: string;
}

/** The level being typed on the stage page, for the page of levels beside it: from the draft kept on this device. */
export function useLevelOnDevice(build: Build): LevelOnDevice | undefined {
  const owner = useDraftOwner();
  const typed = useMemo(() => lastTypedLevel(build, owner), [build, owner]);
  const offered = useQuery({
    ...instrumentsQuery(build.id, typed?.check.id ?? ''),
    enabled: typed !== undefined,
  });
  if (!typed) return undefined;
  const { stage, check, draft } = typed;
  const instrument = chosenOf(offered.data ?? [], draft.value.instrumentId);
  const entry = { ...prefillOf(check, stage.checks, instrument).entry, ...draft.value.entry };
  const live = liveReading(check, entry, instrument?.figures);
  const at = { stageId: stage.id, checkId: check.id };
  if (live.state !== 'read' || check.levelPointId === null) return { entered: undefined, ...at };
  const { value: levelDbm, expandedUncertainty: expandedUncertaintyDb } = live.reading;
  const { levelPointId: pointId } = check;
  return { entered: { pointId, levelDbm, expandedUncertaintyDb, verdict: live.verdict }, ...at };
}
