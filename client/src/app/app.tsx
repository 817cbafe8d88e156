import { MantineProvider } from '@mantine/core';
import { QueryClientProvider } from '@tanstack/react-query';
import { RouterProvider } from 'react-router-dom';
import { Toaster } from '../components/toaster';
import { useTheme } from '../hooks/use-theme';
import { queryClient } from './query-client';
import { router } from './router';
import { cssVariables, theme } from './theme/theme';

export function App() {
  const { scheme } = useTheme();
  return (
    <MantineProvider theme={theme} cssVariablesResolver={cssVariables} forceColorScheme={scheme}>
      <QueryClientProvider client={queryClient}>
        <RouterProvider router={router} />
        <Toaster />
      </QueryClientProvider>
    </MantineProvider>
  );
}
