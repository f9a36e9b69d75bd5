import { QueryClientProvider } from '@tanstack/react-query';
import { Suspense, useState } from 'react';
import { RouterProvider } from 'react-router-dom';
import { Waiting } from './frame/waiting';
import { queryClient } from './lib/query-client';
import { createRouter } from './routes';

export function App() {
  const [router] = useState(createRouter);
  return (
    <QueryClientProvider client={queryClient}>
      <Suspense fallback={<Waiting />}>
        <RouterProvider router={router} />
      </Suspense>
    </QueryClientProvider>
  );
}
