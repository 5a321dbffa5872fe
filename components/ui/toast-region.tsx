"use client";

import { Toast } from "@base-ui/react/toast";
import type { ReactNode } from "react";
import { buttonLook } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";

/** Wraps the page; anything inside may `useToast()`. Messages stand above the bottom bar and read themselves out. */
export function ToastRegion({ children }: { children: ReactNode }) {
  return (
    <Toast.Provider timeout={8000} limit={3}>
      {children}
      <Toast.Portal>
        <Toast.Viewport className="no-print fixed inset-x-3 bottom-[calc(var(--nav-height)+0.75rem+env(safe-area-inset-bottom))] z-50 flex flex-col-reverse gap-2 sm:right-6 sm:left-auto sm:w-96 lg:bottom-6">
          <ToastList />
        </Toast.Viewport>
      </Toast.Portal>
    </Toast.Provider>
  );
}

/** Tells what has just happened: `toast.add({ title, description, type: "error" })`. */
export const useToast = Toast.useToastManager;

function ToastList() {
  const { toasts } = Toast.useToastManager();
  return toasts.map((toast) => (
    <Toast.Root
      key={toast.id}
      toast={toast}
      className={cx(
        "border-2 border-frame bg-raised data-limited:hidden",
        toast.type === "error" && "border-stop-fill bg-stop-ground text-stop",
      )}
    >
      <Toast.Content className="flex items-center gap-3 py-2 pr-2 pl-4">
        <div className="min-w-0 flex-1">
          <Toast.Title className="font-sans text-base font-semibold" />
          <Toast.Description className="text-sm" />
        </div>
        <Toast.Close className={buttonLook({ tone: "quiet" })}>Dismiss</Toast.Close>
      </Toast.Content>
    </Toast.Root>
  ));
}
