import { Bold, Italic, List, Sigma } from 'lucide-react';
import { type KeyboardEvent, type ReactNode, useRef } from 'react';
import { type Control, useController } from 'react-hook-form';
import { FieldFrame, useFieldParts } from '#src/components/field-frame.tsx';
import { type FormPath, fieldId } from './check-question.ts';
import { editMarkdown, type MarkdownAct } from './markdown-edit.ts';
import { MathsOverlay } from './maths-overlay.tsx';
import type { QuestionForm } from './question-shape.ts';

interface MarkdownEditorProps {
  control: Control<QuestionForm>;
  name: FormPath;
  label: string;
  hint?: string;
  rows?: number;
}

const buttons: { act: MarkdownAct; label: string; face: ReactNode; key?: string }[] = [
  { act: 'bold', label: 'Bold', face: <Bold size={17} strokeWidth={1.75} aria-hidden />, key: 'b' },
  { act: 'italic', label: 'Italic', face: <Italic size={17} strokeWidth={1.75} aria-hidden />, key: 'i' },
  { act: 'list', label: 'List', face: <List size={17} strokeWidth={1.75} aria-hidden /> },
  { act: 'maths', label: 'Maths', face: <Sigma size={17} strokeWidth={1.75} aria-hidden />, key: 'm' },
  { act: 'superscript', label: 'Superscript, as in cm³', face: 'cm³' },
  { act: 'subscript', label: 'Subscript, as in H₂O', face: 'H₂O' },
];

/** Height of a line of source: a field that grows with its text forgets its rows. */
const LINE_REM = 1.55;

/** Replaces text as typing would, so that Undo still works. */
function applyEdit(area: HTMLTextAreaElement, act: MarkdownAct) {
  const edit = editMarkdown(act, area.value, area.selectionStart, area.selectionEnd);
  area.focus();
  area.setSelectionRange(edit.from, edit.to);
  if (!document.execCommand('insertText', false, edit.text)) {
    area.setRangeText(edit.text);
    area.dispatchEvent(new Event('input', { bubbles: true }));
  }
  area.setSelectionRange(edit.selectFrom, edit.selectTo);
}

/** Arrow keys move along a toolbar; Tab leaves it. */
function moveAlong(event: KeyboardEvent<HTMLDivElement>) {
  const all = [...event.currentTarget.querySelectorAll('button')];
  const at = all.findIndex((button) => button.matches(':focus'));
  const step = { ArrowRight: 1, ArrowLeft: -1 }[event.key];
  const target = event.key === 'Home' ? 0 : event.key === 'End' ? all.length - 1 : step && at + step;
  if (target === undefined || !all[target]) return;
  event.preventDefault();
  for (const [index, button] of all.entries()) button.tabIndex = index === target ? 0 : -1;
  all[target].focus();
}

/** Markdown with maths: source in a plain field, a toolbar, and Ctrl+B, Ctrl+I and Ctrl+M for the commonest three. */
export function MarkdownEditor({ control, name, label, hint, rows = 5 }: MarkdownEditorProps) {
  const { field, fieldState } = useController({ control, name });
  const area = useRef<HTMLTextAreaElement | null>(null);
  const error = fieldState.error?.message;
  const { id, aria } = useFieldParts(fieldId(name), { hint, error });
  const value = typeof field.value === 'string' ? field.value : '';
  return (
    <FieldFrame
      id={id}
      label={label}
      error={error}
      aside={
        hint ? (
          <span id={`${id}-hint`} className="hint text-right">
            {hint}
          </span>
        ) : null
      }
    >
      <div className={`rounded-sm bg-sheet ${error ? 'border-2 border-gap' : 'border-[1.5px] border-edge'}`}>
        <div
          role="toolbar"
          aria-label={`Format: ${label}`}
          aria-controls={id}
          className="flex flex-wrap gap-1 border-b border-rule px-2 py-1 text-ink-2"
          onKeyDown={moveAlong}
        >
          {buttons.map(({ act, label: name, face, key }, index) => (
            <button
              key={act}
              type="button"
              tabIndex={index === 0 ? 0 : -1}
              aria-label={name}
              title={key ? `${name} (Ctrl+${key.toUpperCase()})` : name}
              className="grid h-8 min-w-8 place-items-center rounded-sm px-1.5 text-sm font-semibold hover:bg-sunk max-md:h-11 max-md:min-w-10"
              onClick={() => area.current && applyEdit(area.current, act)}
            >
              {face}
            </button>
          ))}
        </div>
        <div className="relative font-mono text-[.84rem] leading-[1.55rem]">
          <textarea
            {...field}
            value={value}
            ref={(element) => {
              area.current = element;
              field.ref(element);
            }}
            {...aria}
            rows={rows}
            style={{ minHeight: `${rows * LINE_REM + 1.25}rem` }}
            spellCheck
            className="block w-full resize-y bg-transparent px-3 py-2.5 [field-sizing:content] [overflow-wrap:anywhere]"
            onKeyDown={(event) => {
              const act = buttons.find(({ key }) => key === event.key.toLowerCase())?.act;
              if (!act || !(event.ctrlKey || event.metaKey) || event.altKey || event.shiftKey) return;
              event.preventDefault();
              applyEdit(event.currentTarget, act);
            }}
          />
          <MathsOverlay source={value} area={area} />
        </div>
      </div>
    </FieldFrame>
  );
}
