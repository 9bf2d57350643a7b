import type { AnswerResultDto, SetDto, SetItemDto } from '#shared/schemas/practice.ts';
import { AskView } from './ask-view.tsx';
import { ClosingView } from './closing-view.tsx';
import { KeptView } from './kept-view.tsx';
import { MarkedView } from './marked-view.tsx';
import { RunnerFrame, type RunnerState } from './runner-frame.tsx';
import { RunnerNotes } from './runner-notes.tsx';
import { SelfMarkView } from './self-mark-view.tsx';
import { useHeartbeat } from './use-heartbeat.ts';
import { type RunnerControl, type RunnerProps, useRunner } from './use-runner.ts';

const marksSaid = ({ marks, maxMarks }: AnswerResultDto): string =>
  marks === null ? 'Handed in. Mark it against the scheme.' : `${marks} of ${maxMarks} marks.`;

function Notes({ set, control }: { set: SetDto; control: RunnerControl }) {
  const { waiting, passedIds, place, item, away, keeping, refusal, failure, goOn } = control;
  return (
    <>
      <RunnerNotes
        away={away}
        keeping={keeping}
        waiting={set.items.flatMap(({ id }, index) =>
          waiting.some((entry) => entry.setItemId === id) ? [index + 1] : [],
        )}
        marked={set.items.flatMap(({ id, result }, index) =>
          passedIds.includes(id) && result && index !== place
            ? [{ number: index + 1, onOpen: () => goOn(null, index) }]
            : [],
        )}
        refusal={refusal?.words ?? null}
        isAlready={item?.result?.already ?? false}
      />
      {failure ? (
        <p role="alert" className="note gap mx-5 md:mx-0 mb-4">
          {failure}
        </p>
      ) : null}
    </>
  );
}

/** Next question and Stop here, or the end where nothing is left to ask. */
function Steps({ control }: { control: RunnerControl }) {
  const { nextPlace, place, item, isEnding, waiting, end, goOn } = control;
  // A set may only end once the server has every answer.
  const isHeld = isEnding || waiting.length > 0;
  if (nextPlace < 0 || nextPlace === place) {
    return (
      <button type="button" className="btn big max-md:w-full" disabled={isHeld} onClick={end}>
        Finish the set
      </button>
    );
  }
  return (
    <>
      <button type="button" className="btn quiet big max-md:w-full" disabled={isHeld} onClick={end}>
        Stop here
      </button>
      <button
        type="button"
        className="btn big max-md:w-full max-md:order-first"
        onClick={() => goOn(item?.id ?? null, nextPlace)}
      >
        Next question
      </button>
    </>
  );
}

interface AnsweredProps {
  control: RunnerControl;
  item: SetItemDto;
  viewKey: string;
}

/** Everything after handing in: kept, to be marked by its student, or marked. */
function Answered({ control, item, viewKey }: AnsweredProps) {
  const { entry, away, keeping, place, drafts, saveTicks, isFresh } = control;
  const { result } = item;
  const steps = <Steps control={control} />;
  const number = place + 1;
  if (!result || (entry && away)) {
    const responses = entry?.kind === 'answer' ? entry.body.responses : (result?.responses ?? []);
    return <KeptView key={viewKey} {...{ item, number, responses, keeping, steps }} />;
  }
  if (result.state === 'selfMark') {
    return (
      <SelfMarkView
        key={viewKey}
        item={item}
        number={number}
        result={result}
        kept={drafts.read(item.id)?.ticks}
        isSending={entry !== null}
        onTicks={(ticks) => drafts.write(item.id, { responses: [], howSure: null, seconds: 0, ticks })}
        onSave={saveTicks}
      />
    );
  }
  return <MarkedView key={viewKey} item={item} number={number} result={result} steps={steps} isFresh={isFresh} />;
}

function View({ set, control }: { set: SetDto; control: RunnerControl }) {
  const { item, entry, place, away, answeredIds, secondsBefore, refusal, drafts } = control;
  const state: RunnerState = { set, place: Math.max(place, 0), answeredIds, isFresh: control.isFresh };
  const notes = <Notes set={set} control={control} />;

  if (!item) {
    return (
      <ClosingView
        state={{ ...state, place: Math.max(answeredIds.size - 1, 0) }}
        seconds={secondsBefore}
        left={set.items.length - answeredIds.size}
        notes={notes}
        steps={<Steps control={control} />}
      />
    );
  }
  const viewKey = `${item.id} ${refusal?.count ?? 0}`;
  if (!item.result && !(entry && away)) {
    return (
      <AskView
        key={viewKey}
        state={state}
        item={item}
        draft={drafts.read(item.id)}
        secondsBefore={secondsBefore - (entry?.kind === 'answer' ? entry.body.seconds : 0)}
        isSending={entry !== null}
        isAway={away !== null}
        notes={notes}
        onDraft={(draft) => drafts.write(item.id, draft)}
        onHandIn={control.handIn}
      />
    );
  }
  return (
    <RunnerFrame state={state} seconds={secondsBefore} notes={notes}>
      <Answered control={control} item={item} viewKey={viewKey} />
    </RunnerFrame>
  );
}

/** A set, one question at a time. */
export function Runner(props: RunnerProps) {
  const control = useRunner(props);
  useHeartbeat();
  const { item, entry } = control;
  return (
    <>
      {/* Outside the views, which come and go: a region is only heard when it was there before its words. */}
      <p role="status" className="sr-only">
        {item?.result && !entry ? marksSaid(item.result) : ''}
      </p>
      <View set={props.set} control={control} />
    </>
  );
}
