import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { useDestinations } from '../lib/use-destinations.ts';
import { matchDestinations } from '../lib/match-destinations.ts';
import { PaletteOptions } from './palette-options.tsx';

export interface PaletteProps {
  onClose: () => void;
  isAdministrator: boolean;
  canCreateProgramme: boolean;
}

/** Type a few letters, Enter goes there. */
export default function Palette({ onClose, ...rights }: PaletteProps) {
  const navigate = useNavigate();
  const [text, setText] = useState('');
  const [chosen, setChosen] = useState(0);
  const { destinations, loading } = useDestinations(rights);
  const found = matchDestinations(destinations, text);
  const at = Math.min(chosen, found.length - 1);
  const go = (to: string) => {
    onClose();
    void navigate(to);
  };
  const step = (by: number) => {
    setChosen((at + by + found.length) % Math.max(found.length, 1));
  };
  return (
    <Dialog open onOpenChange={onClose} title="Go to">
      <input
        role="combobox"
        aria-label="Programme, design or page"
        aria-expanded="true"
        aria-controls="palette-options"
        aria-activedescendant={at >= 0 ? `palette-option-${String(at)}` : undefined}
        autoComplete="off"
        spellCheck={false}
        placeholder="Programme, design or page"
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          setChosen(0);
        }}
        onKeyDown={(event) => {
          const option = found[at];
          if (event.key === 'ArrowDown') step(1);
          else if (event.key === 'ArrowUp') step(-1);
          else if (event.key === 'Enter' && option !== undefined) go(option.to);
          else return;
          event.preventDefault();
        }}
        className="control"
      />
      <PaletteOptions options={found} chosen={at} onGo={go} />
      {found.length === 0 && (
        <p role="status" className="m-0 text-ink-soft">
          {loading ? 'Looking …' : `Nothing is called “${text}”.`}
        </p>
      )}
    </Dialog>
  );
}
