"use client";

import dynamic from "next/dynamic";
import type { ComponentProps } from "react";
import type BandsChart from "./bands-chart";

const Drawn = dynamic(() => import("./bands-chart"), {
  ssr: false,
  loading: () => <div className="h-72 border-y border-hairline desk:h-80" />,
});

/** The chart's code is loaded only where the chart is seen; the table beside it is there before and without script. */
export function Bands(props: ComponentProps<typeof BandsChart>) {
  return <Drawn {...props} />;
}
