"use client";

import { useEffect, useRef } from "react";

/** "There is a problem", with a link to each field; takes the focus when it appears. */
export function ErrorSummary({
  message, items, unseen = [], idPrefix,
}: Readonly<{
  message?: string;
  items: ReadonlyArray<{ name: string; message: string }>;
  /** Names without a field that could be gone to. */
  unseen?: ReadonlyArray<string>;
  idPrefix?: string;
}>) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    box.current?.focus();
    const title = document.title;
    if (!title.startsWith("Error: ")) document.title = `Error: ${title}`;
    return () => {
      document.title = document.title.replace(/^Error: /, "");
    };
  }, []);
  return (
    <div ref={box} tabIndex={-1} role="alert" className="mb-6 border-l-4 border-emergency py-1 pl-4 outline-none">
      <h2 className="text-section">There is a problem</h2>
      {items.length === 0 ? <p>{message}</p> : null}
      <ul>
        {items.map(({ name, message: sentence }) => (
          <li key={name}>
            {unseen.includes(name) ? <span className="font-semibold text-emergency">{sentence}</span> : (
              <a
                className="link font-semibold text-emergency"
                href={`#${fieldId(name, idPrefix)}`}
                onClick={(event) => {
                  event.preventDefault();
                  document.getElementById(fieldId(name, idPrefix))?.focus();
                }}
              >
                {sentence}
              </a>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The id of a field's element; the summary's links and labels point at it. Forms that share a page and names differ in prefix. */
export function fieldId(name: string, prefix = "field"): string {
  return `${prefix}-${name.replaceAll(".", "-")}`;
}
