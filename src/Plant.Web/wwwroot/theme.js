// Light or dark before the first paint: the person's choice, else the system's.
(() => {
  const key = 'theme';
  const apply = (choice) => {
    if (choice === 'light' || choice === 'dark') document.documentElement.dataset.theme = choice;
    else delete document.documentElement.dataset.theme;
  };
  apply(localStorage.getItem(key));
  document.addEventListener('click', (e) => {
    const button = e.target.closest('[data-theme-toggle]');
    if (!button) return;
    const dark = document.documentElement.dataset.theme
      ? document.documentElement.dataset.theme === 'dark'
      : matchMedia('(prefers-color-scheme: dark)').matches;
    const next = dark ? 'light' : 'dark';
    localStorage.setItem(key, next);
    apply(next);
    document.dispatchEvent(new CustomEvent('themechange'));
  });
  document.addEventListener('keydown', (e) => {
    if ((e.ctrlKey || e.metaKey) && e.key.toLowerCase() === 'k') {
      const box = document.getElementById('find');
      if (box) { e.preventDefault(); box.focus(); box.select(); }
    }
  });
})();
