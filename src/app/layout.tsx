import type { Metadata, Viewport } from "next";
import localFont from "next/font/local";
import { connection } from "next/server";
import type { ReactNode } from "react";
import "./globals.css";

const text = localFont({
  src: "../../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2",
  variable: "--font-text",
  weight: "200 800",
  display: "swap",
});

const heading = localFont({
  src: "../../node_modules/@fontsource-variable/fraunces/files/fraunces-latin-full-normal.woff2",
  variable: "--font-heading",
  weight: "100 900",
  display: "swap",
});

export const metadata: Metadata = {
  title: { default: "Notchbook", template: "%s · Notchbook" },
  description: "The journal of small changes for a new closed-loop insulin setup.",
  robots: { index: false },
};

export const viewport: Viewport = {
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#faf7f0" },
    { media: "(prefers-color-scheme: dark)", color: "#15181f" },
  ],
};

/** Rendered per request: the page's scripts carry a nonce that no stored page could have. */
export default async function RootLayout({ children }: Readonly<{ children: ReactNode }>) {
  await connection();
  return (
    <html lang="en" className={`${text.variable} ${heading.variable}`}>
      <body className="bg-paper font-sans text-base text-ink">{children}</body>
    </html>
  );
}
