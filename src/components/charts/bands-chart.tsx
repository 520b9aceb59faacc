"use client";

import { CategoryScale, Chart, Filler, LinearScale, LineElement, PointElement, Tooltip, type ChartData, type ChartOptions, type Plugin } from "chart.js";
import { useEffect, useState } from "react";
import { Line } from "react-chartjs-2";
import { clockText } from "@/domain/settings/clock-text";
import type { Band } from "./band";

Chart.register(CategoryScale, LinearScale, PointElement, LineElement, Filler, Tooltip);

type Colours = Record<"ink" | "soft" | "hairline" | "band" | "before" | "wash" | "low" | "high", string>;

function readColours(): Colours {
  const style = getComputedStyle(document.documentElement);
  const of = (name: string) => style.getPropertyValue(`--${name}`).trim();
  return { ink: of("ink"), soft: of("soft"), hairline: of("hairline"), band: of("band"), before: of("before"), wash: of("wash"), low: of("low"), high: of("high") };
}

/** Two time-of-day bands laid over each other: before dashed and hollow, after filled. */
export default function BandsChart({
  before, after, governed, thresholds, unit, label,
}: Readonly<{
  before: ReadonlyArray<Band>;
  after: ReadonlyArray<Band>;
  /** Minutes of the day that the change governs, washed; null for the whole day. */
  governed: readonly [number, number] | null;
  thresholds: Readonly<{ low: number; high: number }>;
  unit: string;
  label: string;
}>) {
  const [colours, setColours] = useState<Colours | null>(null);
  useEffect(() => {
    const read = () => setColours(readColours());
    read();
    const dark = matchMedia("(prefers-color-scheme: dark)");
    dark.addEventListener("change", read);
    return () => dark.removeEventListener("change", read);
  }, []);
  if (!colours) return null;
  const minutes = Array.from({ length: 48 }, (_, i) => i * 30);
  const pick = (bands: ReadonlyArray<Band>, key: "p25" | "p50" | "p75") => minutes.map((m) => bands.find((b) => b.minute === m)?.[key] ?? null);
  const none = { pointRadius: 0, spanGaps: false, tension: 0.3 };
  const data: ChartData<"line", (number | null)[], string> = {
    labels: minutes.map(clockText),
    // The first is drawn on top: lines before bands.
    datasets: [
      { ...none, label: "after, middle", data: pick(after, "p50"), borderColor: colours.ink, borderWidth: 3 },
      { ...none, label: "before, middle", data: pick(before, "p50"), borderColor: colours.before, borderWidth: 2.5, borderDash: [7, 5] },
      { ...none, label: "before, a quarter lies above", data: pick(before, "p75"), borderColor: colours.before, borderWidth: 1, borderDash: [2, 3] },
      { ...none, label: "before, a quarter lies below", data: pick(before, "p25"), borderColor: colours.before, borderWidth: 1, borderDash: [2, 3] },
      { ...none, label: "after, a quarter lies above", data: pick(after, "p75"), borderWidth: 0, fill: "+1", backgroundColor: colours.band },
      { ...none, label: "after, a quarter lies below", data: pick(after, "p25"), borderWidth: 0 },
    ],
  };
  const font = { family: getComputedStyle(document.body).fontFamily, size: 14 };
  const options: ChartOptions<"line"> = {
    responsive: true,
    maintainAspectRatio: false,
    animation: false,
    interaction: { mode: "index", intersect: false },
    layout: { padding: { top: 22 } },
    plugins: { legend: { display: false }, tooltip: { titleFont: font, bodyFont: font } },
    scales: {
      x: { grid: { display: false }, ticks: { color: colours.soft, font, maxRotation: 0, autoSkip: false, callback: (_v, i) => (i % 12 === 0 ? clockText(i * 30) : null) } },
      y: { grid: { color: colours.hairline }, border: { display: false }, ticks: { color: colours.soft, font, maxTicksLimit: 6 }, title: { display: true, text: unit, color: colours.soft, font } },
    },
  };
  return (
    <div className="h-72 desk:h-80">
      <Line data={data} options={options} plugins={[marks(colours, governed, thresholds)]} role="img" aria-label={label} />
    </div>
  );
}

/** The governed hours as a wash, the thresholds as dotted lines with their numbers, and direct labels. */
function marks(colours: Colours, governed: readonly [number, number] | null, thresholds: Readonly<{ low: number; high: number }>): Plugin<"line"> {
  return {
    id: "marks",
    beforeDatasetsDraw: ({ ctx, chartArea, scales }) => {
      const x = scales.x;
      const y = scales.y;
      if (!x || !y) return;
      ctx.save();
      if (governed) {
        const [left, right] = governed.map((m) => chartArea.left + (chartArea.width * m) / 1410);
        ctx.fillStyle = colours.wash;
        ctx.fillRect(left ?? 0, chartArea.top, Math.min(chartArea.right, right ?? 0) - (left ?? 0), chartArea.height);
      }
      ctx.setLineDash([2, 3]);
      for (const [value, colour] of [[thresholds.low, colours.low], [thresholds.high, colours.high]] as const) {
        ctx.strokeStyle = colour;
        ctx.beginPath();
        ctx.moveTo(chartArea.left, y.getPixelForValue(value));
        ctx.lineTo(chartArea.right, y.getPixelForValue(value));
        ctx.stroke();
      }
      ctx.restore();
    },
    afterDatasetsDraw: ({ ctx, chartArea }) => {
      ctx.save();
      ctx.font = `600 13px ${getComputedStyle(document.body).fontFamily}`;
      ctx.fillStyle = colours.ink;
      ctx.textBaseline = "bottom";
      ctx.fillText("after, shaded", chartArea.left + 4, chartArea.top - 4);
      ctx.fillStyle = colours.soft;
      ctx.fillText("before, dashed", chartArea.left + 110, chartArea.top - 4);
      ctx.restore();
    },
  };
}
