import { asProblem } from '../../lib/api/api-problem.ts';

const toaster = () => import('sonner').then((module) => module.toast);

/** Short notices at the screen's edge, for what happened out of sight. Failures a person must act on belong in place (Problem). */
export const notify = {
  done(message: string): void {
    void toaster().then((toast) => toast.success(message));
  },
  failed(message: string, error?: unknown): void {
    void toaster().then((toast) =>
      toast.error(message, error === undefined ? {} : { description: asProblem(error).message }),
    );
  },
};
