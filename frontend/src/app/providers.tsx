import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import { App as AntdApp, ConfigProvider } from 'antd';
import { useMemo, type ReactNode } from 'react';
import { antdTheme } from './theme/antd-theme';
import { ThemeChoiceProvider, useThemeChoice } from './theme/theme-choice';

function Antd({ children }: { children: ReactNode }) {
  const { theme } = useThemeChoice();
  const config = useMemo(() => antdTheme(theme), [theme]);
  return (
    <ConfigProvider theme={config} wave={{ disabled: true }}>
      <AntdApp>{children}</AntdApp>
    </ConfigProvider>
  );
}

/** What every page stands in; tests put the same around a page. */
export function Providers({ queryClient, children }: { queryClient: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeChoiceProvider>
        <Antd>{children}</Antd>
      </ThemeChoiceProvider>
    </QueryClientProvider>
  );
}
