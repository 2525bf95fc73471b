// The bench: digits and keys are handled here; an accepted cell is sent, and sent again until the server told that it is saved.
const root = document.getElementById('bench');
const csrf = root.querySelector('input[name=__RequestVerificationToken]').value;
const $ = (id) => document.getElementById(id);
const grid = $('bench-grid'), ask = $('bench-ask'), bottle = $('bottle'), banner = $('components-reconnect-modal');
const waiting = 'bench-waiting', open = 'bench-open';
let batch = null, here = { row: 0, cell: 0 }, editing = false, choices = null, shown = null;

const stored = (key, other) => JSON.parse(sessionStorage.getItem(key) ?? 'null') ?? other;
const store = (key, value) => { if (value === null) sessionStorage.removeItem(key); else sessionStorage.setItem(key, JSON.stringify(value)); };
const pause = (ms) => new Promise((done) => setTimeout(done, ms));

async function call(method, path, body) {
  const began = Date.now();
  for (let n = 0; ; n++) {
    try {
      const answer = await fetch('/bench/batches' + path, {
        method, headers: { 'X-CSRF-Token': csrf, ...(body === undefined ? {} : { 'Content-Type': 'application/json' }) }, body: body === undefined ? undefined : JSON.stringify(body),
      });
      if (answer.redirected) { location.reload(); await pause(60000); }
      if (answer.status < 500) {
        banner.classList.remove('components-reconnect-show');
        const told = await answer.json();
        return answer.ok ? told : { refused: told.detail ?? told.title };
      }
    } catch { /* no link: told in the banner, and asked again below */ }
    if (Date.now() - began >= 1000) banner.classList.add('components-reconnect-show');
    await pause(Math.min(250 * 2 ** n, 2000));
  }
}

// cells that were accepted here and not yet told to be saved, in their order
let sending = null;
function send() {
  sending ??= (async () => {
    for (let queue = stored(waiting, []); queue.length; queue = stored(waiting, [])) {
      const one = queue[0];
      tell(`saving ${queue.length} …`);
      const told = await call('PUT', `/rows/${one.row}/cells/${one.cell}`, { text: one.text });
      store(waiting, stored(waiting, []).slice(1));
      if (told.refused) say(told.refused, {});
    }
    sending = null;
    await load();
    tell(`✓ saved ${new Date().toTimeString().slice(0, 5)}, ${batch.rows.reduce((n, r) => n + r.cells.filter((c) => c).length, 0)} cells`);
  })();
  return sending;
}
const tell = (text) => { $('bench-saved').textContent = text; };

async function load() {
  const told = await call('GET', '/open');
  if (told.refused) { say(told.refused, {}); return; }
  batch = told;
  for (const one of stored(waiting, [])) {
    const row = batch.rows.find((r) => r.id === one.row);
    if (row) { while (row.cells.length <= one.cell) row.cells.push(''); row.cells[one.cell] = one.text; }
  }
  draw();
}

const figure = (v) => v === null || v === undefined ? '–' : v >= 99.5 ? Math.round(v).toString() : v.toFixed(1);
const cellOf = (row, cell) => grid.tBodies[0].rows[row]?.querySelector(`input[data-cell="${cell}"]`);
function element(name, text, className) { const e = document.createElement(name); if (text !== undefined) e.textContent = text; if (className) e.className = className; return e; }

function draw() {
  const form = batch.id + batch.cellNames.join();
  if (shown !== form) {
    shown = form;
    const head = element('tr');
    for (const name of ['Bottle', 'Reservoir', 'Point', ...batch.cellNames, 'ppm', 'Expected', 'Check', 'State']) {
      const th = element('th', name, ['Bottle', 'Reservoir', 'Point', 'Check', 'State'].includes(name) ? '' : 'num');
      th.scope = 'col';
      head.append(th);
    }
    grid.tHead.replaceChildren(head);
    grid.tBodies[0].replaceChildren();
    for (const field of $('bench-head').elements) if (field.name) field.value = batch.header[field.name] ?? '';
  }
  const body = grid.tBodies[0];
  while (body.rows.length > batch.rows.length) body.deleteRow(-1);
  batch.rows.forEach((row, r) => drawRow(body.rows[r] ?? body.insertRow(), row));
  if (!grid.querySelector('input[tabindex="0"]')) cellOf(0, 0)?.setAttribute('tabindex', '0');
  const done = batch.rows.filter((r) => !r.released && !r.setAside && r.complete && !r.wrong).length;
  $('bench-release').textContent = `Release ${done} ${done === 1 ? 'result' : 'results'}`;
  $('bench-release').disabled = done === 0;
  $('bench-count').textContent = batch.rows.length ? `${batch.rows.length} ${batch.rows.length === 1 ? 'bottle' : 'bottles'}` : '';
}

function drawRow(line, row) {
  if (line.dataset.id !== row.id) {
    line.dataset.id = row.id;
    line.replaceChildren();
    const name = element('th'); name.scope = 'row'; name.append(element('b', row.bottle)); line.append(name);
    line.append(element('td', row.tag), element('td', row.point, 'iv'));
    batch.cellNames.forEach((title, c) => {
      const td = element('td', undefined, 'num'), input = element('input');
      input.dataset.cell = c; input.tabIndex = -1; input.inputMode = 'decimal'; input.setAttribute('aria-label', `${title} of ${row.bottle}`);
      td.append(input); line.append(td);
    });
    for (const kind of ['num mean', 'num iv', 'check', 'iv']) line.append(element('td', '', kind));
  }
  const cells = line.cells, first = 3 + batch.cellNames.length;
  batch.cellNames.forEach((_, c) => {
    const input = cells[3 + c].firstChild;
    if (document.activeElement !== input || !editing) input.value = row.cells[c] ?? '';
    input.readOnly = row.released || row.setAside;
  });
  cells[first].replaceChildren(element('b', figure(row.meanPpm), row.warning ? 'doubt' : ''));
  cells[first + 1].textContent = row.expectedLowPpm === null ? 'none' : `${figure(row.expectedLowPpm)}–${figure(row.expectedHighPpm)}`;
  cells[first + 2].textContent = row.setAside ? 'set aside: dirty bottle' : row.wrong || (row.warning ? `◆ ${row.warning}` : row.meanPpm === null ? '' : 'fits');
  cells[first + 3].textContent = row.released ? 'released' : row.setAside ? 'aside' : row.complete ? 'saved' : '';
}

function go(row, cell, edit) {
  if (!batch.rows.length) { bottle.focus(); return; }
  here = { row: Math.max(0, Math.min(row, batch.rows.length - 1)), cell: Math.max(0, Math.min(cell, batch.cellNames.length - 1)) };
  const input = cellOf(here.row, here.cell);
  for (const other of grid.querySelectorAll('input[tabindex="0"]')) other.tabIndex = -1;
  input.tabIndex = 0;
  editing = !!edit;
  input.focus();
  if (edit) input.setSelectionRange(input.value.length, input.value.length); else input.select();
}

// a cell is accepted: kept here, sent, and the focus moves on at once
function accept(input) {
  const row = batch.rows[here.row], text = input.value.trim();
  if (!row || row.released || row.setAside || (row.cells[here.cell] ?? '') === text) { store(open, null); editing = false; return true; }
  if (text && !/^[+-]?\d*[.,]?\d+$/.test(text)) { say(`${row.bottle}: "${text}" is no number. Type digits with a point or a comma; Esc brings back what stood there.`, {}); input.select(); return false; }
  while (row.cells.length <= here.cell) row.cells.push('');
  row.cells[here.cell] = text;
  store(waiting, [...stored(waiting, []), { row: row.id, cell: here.cell, text }]);
  store(open, null);
  editing = false;
  hush();
  send();
  return true;
}

grid.addEventListener('focusin', (e) => {
  if (e.target.dataset.cell !== undefined) here = { row: e.target.closest('tr').sectionRowIndex, cell: +e.target.dataset.cell };
});
grid.addEventListener('input', (e) => { editing = true; store(open, { row: batch.rows[here.row].id, cell: here.cell, text: e.target.value }); });
grid.addEventListener('keydown', (e) => {
  const input = e.target;
  if (input.dataset.cell === undefined) return;
  const { row, cell } = here, width = batch.cellNames.length;
  const move = (r, c) => { e.preventDefault(); if (accept(input)) go(r, c); };
  switch (e.key) {
    case 'Enter':
      if (e.ctrlKey) return;
      e.preventDefault();
      if (!accept(input)) return;
      if (cell + 1 < width) go(row, cell + 1); else { bottle.focus(); bottle.select(); }
      return;
    case 'ArrowUp': return move(row - 1, cell);
    case 'ArrowDown': return move(row + 1, cell);
    case 'ArrowLeft': if (!editing) move(row, cell - 1); return;
    case 'ArrowRight': if (!editing) move(row, cell + 1); return;
    case 'Home': if (e.ctrlKey) move(0, 0); else if (!editing) move(row, 0); return;
    case 'End': if (e.ctrlKey) move(batch.rows.length - 1, width - 1); else if (!editing) move(row, width - 1); return;
    case 'F2': e.preventDefault(); go(row, cell, true); return;
    case 'z': if (!e.ctrlKey) return; // falls through: Ctrl Z restores like Esc
    case 'Escape': e.preventDefault(); input.value = batch.rows[row].cells[cell] ?? ''; editing = false; store(open, null); input.select(); return;
  }
});

$('bench-scan').addEventListener('submit', async (e) => {
  e.preventDefault();
  const code = bottle.value.trim();
  if (!code) return;
  bottle.value = '';
  await scan(code);
});
async function scan(code) {
  const told = await call('POST', `/${batch.id}/scan`, { row: crypto.randomUUID(), bottle: code });
  const back = () => bottle.focus();
  if (told.refused) { say(told.refused, {}); return; }
  if (told.kind === 'opened' || told.kind === 'twice') {
    await load();
    const at = batch.rows.findIndex((r) => r.id === told.row);
    if (told.kind === 'twice') { beep(); say(told.text + '.', { 1: ['Go to it', () => go(at, 0)], 2: ['Leave it', back] }); return; }
    hush();
    go(at, 0);
    return;
  }
  beep();
  const choice = told.kind === 'unknown' ? { 1: ['Log it for a reservoir', () => logBottle(code)], 2: ['Leave it', back] }
    : told.kind === 'done' ? { 1: ['See the record', () => { location.href = `/records?kind=sample&key=${encodeURIComponent(code)}`; }], 2: ['Leave it', back] }
    : { 1: ['Leave it', back] };
  say(told.text + '.', choice);
}
function logBottle(code) {
  ask.hidden = false;
  const form = element('form'), label = element('label', `Tag of the reservoir that ${code} was taken from just now`), input = element('input'), button = element('button', 'Log it', 'btn');
  input.id = 'bottle-tag'; label.htmlFor = input.id; form.autocomplete = 'off';
  form.append(label, input, button);
  ask.replaceChildren(form);
  input.focus();
  form.addEventListener('submit', async (e) => {
    e.preventDefault();
    const told = await call('POST', '/bottles', { bottle: code, tag: input.value.trim() });
    if (told.refused) { say(told.refused, { 1: ['Try again', () => logBottle(code)], 2: ['Leave it', () => bottle.focus()] }); return; }
    hush();
    await scan(code);
  });
}

// a question with its keys
function say(text, keys) {
  choices = Object.keys(keys).length ? keys : null;
  ask.hidden = false;
  ask.replaceChildren(element('p', text));
  for (const [key, [label, act]] of Object.entries(keys)) {
    const button = element('button', undefined, 'btn');
    button.type = 'button';
    button.append(element('kbd', key), ` ${label}`);
    button.addEventListener('click', () => { hush(); act(); });
    ask.append(button);
  }
  if (choices) ask.querySelector('button').focus();
}
function hush() { choices = null; ask.hidden = true; ask.replaceChildren(); }
function beep() {
  try { const a = new AudioContext(), o = a.createOscillator(); o.frequency.value = 440; o.connect(a.destination); o.start(); o.stop(a.currentTime + 0.12); } catch { /* no sound: the text tells it */ }
}

document.addEventListener('keydown', (e) => {
  if (choices?.[e.key] && !['INPUT', 'SELECT'].includes(document.activeElement?.tagName)) { e.preventDefault(); const act = choices[e.key][1]; hush(); act(); return; }
  if (e.ctrlKey && e.key === 'Enter') { e.preventDefault(); release(); }
  if (e.altKey && e.key.toLowerCase() === 'h') { e.preventDefault(); $('h-method').focus(); }
});
$('bench-release').addEventListener('click', release);
async function release() {
  const active = document.activeElement, back = () => bottle.focus();
  if (active?.dataset?.cell !== undefined && !accept(active)) return;
  await send();
  const mine = batch.rows.filter((r) => !r.released && !r.setAside), ready = mine.filter((r) => r.complete && !r.wrong), doubtful = ready.filter((r) => r.warning), left = mine.length - ready.length;
  if (!ready.length) { say('No result is complete yet.', { 1: ['Back to the bottles', back] }); return; }
  const keys = { 1: [`Release ${ready.length}`, async () => {
    const told = await call('POST', `/${batch.id}/release`);
    if (told.refused) { say(told.refused, { 1: ['Back', back] }); return; }
    await load();
    say(`Released: ${told.released.length} ${told.released.length === 1 ? 'result' : 'results'}. The advice follows them now.`, { 1: ['Go on', back] });
  }], 2: ['Not yet', back] };
  if (doubtful.length) keys[3] = [`Set ${doubtful[0].bottle} aside as a dirty bottle`, async () => { await call('PUT', `/rows/${doubtful[0].id}/aside`, { aside: true }); await load(); release(); }];
  say(`${ready.length} ready${doubtful.length ? `, of them ${doubtful.length} worth a second look: ${doubtful.map((r) => `${r.bottle} ${figure(r.meanPpm)} ppm (${r.warning})`).join('; ')}` : ''}${left ? `; ${left} incomplete stay here` : ''}.`, keys);
}

$('bench-head').addEventListener('change', async () => {
  const header = {};
  for (const field of $('bench-head').elements) {
    if (field.name) header[field.name] = ['method', 'entry', 'instrument'].includes(field.name) ? field.value : field.name === 'duplicates' ? field.value === 'true' : field.value.trim() === '' ? null : Number(field.value.replace(',', '.'));
  }
  const told = await call('PUT', `/${batch.id}/header`, header);
  if (told.refused) { shown = null; await load(); say(told.refused, { 1: ['Back', () => $('h-method').focus()] }); return; }
  batch = told; draw(); tell('✓ header saved');
});
$('bench-head').addEventListener('submit', (e) => { e.preventDefault(); bottle.focus(); });

await load();
const left = stored(open, null);
if (stored(waiting, []).length) await send();
const row = left ? batch.rows.findIndex((r) => r.id === left.row && !r.released) : -1;
if (row >= 0) { go(row, left.cell, true); cellOf(row, left.cell).value = left.text; editing = true; } else bottle.focus();
root.dataset.live = 'true';
