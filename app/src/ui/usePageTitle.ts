import { useEffect } from "react";

export function usePageTitle(title: string): void {
  useEffect(() => {
    document.title = title === "Linkwright" ? title : `${title} · Linkwright`;
  }, [title]);
}
