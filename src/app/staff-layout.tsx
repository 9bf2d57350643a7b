import { Outlet } from 'react-router-dom';
import { ToastProvider } from '#src/components/toast.tsx';

/** What the pages of staff stand in, beside the frame of every page. */
export function Component() {
  return (
    <ToastProvider>
      <Outlet />
    </ToastProvider>
  );
}
