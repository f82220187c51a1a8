import { Dialog } from '../../../components/ui/dialog.tsx';

const GROUPS: readonly { title: string; keys: readonly (readonly [string, string])[] }[] = [
  {
    title: 'Everywhere',
    keys: [
      ['Ctrl K or ⌘ K', 'Go to a programme, design or page'],
      ['?', 'This list'],
      ['Esc', 'Close what floats'],
    ],
  },
  {
    title: 'Lists',
    keys: [['↑ ↓', 'Row to row, in the same column of controls']],
  },
  {
    title: 'Plots',
    keys: [
      ['← →', 'Move the cursor'],
      ['Home End', 'To the ends'],
    ],
  },
  {
    title: 'Station table',
    keys: [
      ['↑ ↓ ← →', 'Cell to cell; with Shift a range'],
      ['Enter or F2', 'Edit the cell'],
      ['Tab', 'Next cell'],
      ['Ctrl C, Ctrl V', 'Copy to and paste from a spreadsheet'],
      ['Ctrl Z, Ctrl Y', 'Undo, redo'],
    ],
  },
];

export default function ShortcutList({ onClose }: { onClose: () => void }) {
  return (
    <Dialog open onOpenChange={onClose} title="Keys">
      {GROUPS.map((group) => (
        <section key={group.title}>
          <h3 className="m-0 mb-1 text-[13px] font-medium text-ink-soft">{group.title}</h3>
          <dl className="m-0 grid grid-cols-[9rem_1fr] gap-y-1">
            {group.keys.map(([key, does]) => (
              <div key={key} className="contents">
                <dt className="figures text-[13px]">{key}</dt>
                <dd className="m-0">{does}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </Dialog>
  );
}
