import { Toaster as Parts } from 'sonner';
import { useTheme } from '../../lib/theme/theme.ts';

/** Where notices appear; mounted once, lazily. */
export default function Toaster() {
  const theme = useTheme();
  return (
    <Parts
      theme={theme}
      position="bottom-right"
      closeButton
      toastOptions={{
        unstyled: true,
        className:
          'flex w-[min(22rem,calc(100vw-2rem))] items-start gap-2 rounded-xs border border-rule-strong bg-paper px-3 py-2 text-[14px] text-ink shadow-float',
        classNames: {
          description: 'text-ink-soft',
          closeButton: 'order-last ml-auto cursor-pointer border-0 bg-transparent text-ink-soft',
        },
      }}
    />
  );
}
