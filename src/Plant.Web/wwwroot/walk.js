// The walker's form on a weak link: what was typed is kept on the phone until the server answered; a second tap sends nothing twice.
const form = document.getElementById('walk'), note = document.getElementById('walk-kept'), key = 'walk:' + location.pathname;
const kept = JSON.parse(localStorage.getItem(key) ?? 'null');
const fields = () => [...form.elements].filter((f) => f.name && f.name !== '__RequestVerificationToken');
if (new URLSearchParams(location.search).get('done') === 'true') localStorage.removeItem(key);
else if (kept) {
  for (const field of fields()) if (kept[field.name] !== undefined) { if (field.type === 'radio') field.checked = field.value === kept[field.name]; else field.value = kept[field.name]; }
  note.textContent = 'What you typed before is still here.';
}
form.addEventListener('input', () => {
  const values = {};
  for (const field of fields()) if (field.type !== 'radio' || field.checked) values[field.name] = field.value;
  localStorage.setItem(key, JSON.stringify(values));
});
let sending = false;
form.addEventListener('submit', async (e) => {
  e.preventDefault();
  if (sending) return;
  sending = true;
  for (let n = 0; ; n++) {
    try {
      const answer = await fetch(form.action, { method: 'POST', body: new URLSearchParams(new FormData(form)) });
      if (answer.status < 500) { location.href = answer.url; return; }
    } catch { /* no link: kept on the phone, and tried again below */ }
    note.textContent = 'Kept on this phone until the network is back; trying again …';
    await new Promise((done) => setTimeout(done, Math.min(500 * 2 ** n, 5000)));
  }
});
