"use client";

import { useEffect, useState } from "react";

/** How many rows have been read so far, asked of the server once a second; survives a reload of the page. */
export function ImportProgress({ journalId, importId, onEnd }: Readonly<{ journalId: string; importId: string; onEnd?: "reload" }>) {
  const [rows, setRows] = useState<number | null>(null);
  useEffect(() => {
    const timer = setInterval(() => {
      void fetch(`/api/v1/journals/${journalId}/imports/${importId}`)
        .then((response) => (response.ok ? (response.json() as Promise<{ status: string; rows: number }>) : null))
        .then((answer) => {
          if (!answer) return;
          setRows(answer.rows);
          if (answer.status !== "running" && onEnd === "reload") location.reload();
        })
        .catch(() => undefined);
    }, 1000);
    return () => clearInterval(timer);
  }, [journalId, importId, onEnd]);
  return <p role="status" className="mt-4">{rows === null ? "Reading the file …" : `${rows} rows read so far …`} You can leave this page; it goes on.</p>;
}
