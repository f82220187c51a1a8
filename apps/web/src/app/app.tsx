import { QueryClientProvider } from '@tanstack/react-query';
import { Suspense, lazy, useState } from 'react';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from '../lib/api/query-client.ts';
import { createRouter } from './router.tsx';

const Toaster = lazy(() => import('../components/ui/toaster.tsx'));

export function App() {
  const [client] = useState(createQueryClient);
  const [router] = useState(createRouter);
  return (
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
      <Suspense fallback={null}>
        <Toaster />
      </Suspense>
    </QueryClientProvider>
  );
}
