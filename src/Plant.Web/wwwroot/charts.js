// The tokens' colours and the room for a chart, and the news that either changed.
const narrow = matchMedia('(max-width: 700px)');
const dark = matchMedia('(prefers-color-scheme: dark)');
export function look() {
  const s = getComputedStyle(document.documentElement);
  const token = (name) => s.getPropertyValue(name).trim();
  return {
    ink: token('--ink'), ink2: token('--ink-2'), line: token('--line'), line2: token('--line-2'),
    water: token('--water'), water2: token('--water-2'), water3: token('--water-3'),
    oil: token('--oil'), oil2: token('--oil-2'), sheet: token('--sheet'), narrow: narrow.matches,
  };
}
export function watch(chart) {
  const tell = () => chart.invokeMethodAsync('LookChanged').catch(() => {});
  document.addEventListener('themechange', tell);
  for (const query of [narrow, dark]) query.addEventListener('change', tell);
  return {
    stop: () => {
      document.removeEventListener('themechange', tell);
      for (const query of [narrow, dark]) query.removeEventListener('change', tell);
    },
  };
}
export async function load(interop, script) {
  const { importScript } = await import(interop);
  await importScript('plotly-import', script);
}
