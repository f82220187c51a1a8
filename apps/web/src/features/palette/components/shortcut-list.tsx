import { Dialog } from '../../../components/ui/dialog.tsx';

/** Keys of one part of the application, each with what it does. */
export interface KeyGroup {
  readonly title: string;
  readonly keys: readonly (readonly [string, string])[];
}

const GROUPS: readonly KeyGroup[] = [
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
];

/** Every key there is; features bring theirs as `groups`. */
export default function ShortcutList({
  onClose,
  groups,
}: {
  onClose: () => void;
  groups: readonly KeyGroup[];
}) {
  return (
    <Dialog open onOpenChange={onClose} title="Keys">
      {[...GROUPS, ...groups].map((group) => (
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
