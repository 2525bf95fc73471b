// Colours of the tokens for a chart, and the news that the theme changed.
export function colours() {
  const s = getComputedStyle(document.documentElement);
  return ['--ink', '--ink-2', '--ink-3', '--line', '--line-2', '--water', '--oil', '--oil-2', '--sheet'].map((n) => s.getPropertyValue(n).trim());
}
export function watch(page) {
  const tell = () => page.invokeMethodAsync('ThemeChanged').catch(() => {});
  document.addEventListener('themechange', tell);
  const system = matchMedia('(prefers-color-scheme: dark)');
  system.addEventListener('change', tell);
  return { stop: () => { document.removeEventListener('themechange', tell); system.removeEventListener('change', tell); } };
}
