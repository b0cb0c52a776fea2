// Puts in what is far down, and filters the findings. Where no scripts run the page is complete without it.
(() => {
  'use strict';
  // Text within <noscript> costs the browser next to nothing, where the elements would keep it busy for half a second before anybody
  // can scroll. It is put in piece by piece while there is nothing else to do, and at once where it is asked for.
  const late = [...document.querySelectorAll('main noscript')];
  const awaited = new Set();

  function putIn(piece) {
    const notice = piece.previousElementSibling;
    if (notice?.matches('.late')) notice.remove();
    piece.insertAdjacentHTML('beforebegin', piece.textContent);
    piece.remove();
  }

  function putInSome(deadline) {
    while (late.length) {
      putIn(late.shift());
      if (deadline.timeRemaining() < 5) break;
    }

    goOn();
  }

  function goOn() {
    if (late.length) {
      (window.requestIdleCallback ?? (next => setTimeout(next, 0, { timeRemaining: () => 0 })))(putInSome, { timeout: 500 });
      return;
    }

    awaited.forEach(act => act());
    awaited.clear();
  }

  function whenWhole(act) {
    if (late.length) awaited.add(act);
    else act();
  }

  function putInAll() {
    late.splice(0).forEach(putIn);
    goOn();
  }

  // The element with an id, put in if it is not there yet.
  function reach(id) {
    const at = late.findIndex(piece => piece.textContent.includes(`id="${id}"`));
    if (at >= 0) putIn(late.splice(at, 1)[0]);
    return document.getElementById(id);
  }

  const form = document.querySelector('.filter');
  const verdicts = [...form.elements.verdict];
  const status = form.querySelector('[role=status]');
  const none = document.querySelector('.none');
  const MOST_UNFOLDED = 400;
  let total;
  const boards = [...form.elements.board.options].map(option => option.value).slice(2).sort((a, b) => b.length - a.length);
  let known;

  // An id is made of rule and subject; a subject begins with its board.
  function boardOf(id) {
    const subject = id.slice(id.indexOf('__') + 2);
    return boards.find(board => subject === board || subject.startsWith(board + '_-')) ?? '';
  }

  // Read when first asked for, so that opening a large page costs nothing.
  const index = () => known ??= [...document.querySelectorAll('.rule')].map(rule => ({
    rule,
    clause: rule.dataset.clause,
    head: (rule.querySelector('summary').textContent + ' ' + rule.querySelector('.about').textContent).toLowerCase(),
    wasOpen: rule.open,
    findings: [...rule.querySelectorAll('.f')].map(finding => ({
      finding,
      verdict: /is-(\w+)/.exec(finding.className)[1],
      board: boardOf(finding.id),
    })),
  }));

  const asked = () => ({
    verdicts: new Set(verdicts.filter(box => box.checked).map(box => box.value)),
    clause: form.elements.clause.value,
    board: form.elements.board.value,
    text: form.elements.text.value.trim().toLowerCase(),
  });

  const isPlain = ask => ask.verdicts.size === verdicts.length && !ask.clause && ask.board === '*' && !ask.text;

  const words = entry => entry.words ??= entry.finding.textContent.toLowerCase();

  function matches(ask, rule, entry) {
    return ask.verdicts.has(entry.verdict)
      && (ask.board === '*' || entry.board === ask.board)
      && (!ask.text || rule.hit || words(entry).includes(ask.text));
  }

  function count() {
    total = document.querySelectorAll('.f').length;
    status.textContent = `${total} findings`;
  }

  function apply() {
    const ask = asked();
    const plain = isPlain(ask);
    const rules = index();
    let shown = 0;
    for (const rule of rules) {
      rule.hit = ask.text !== '' && rule.head.includes(ask.text);
      rule.shown = 0;
      const clause = !ask.clause || rule.clause === ask.clause;
      for (const entry of rule.findings) {
        const on = clause && matches(ask, rule, entry);
        entry.finding.classList.toggle('off', !on);
        rule.shown += on ? 1 : 0;
      }

      rule.rule.classList.toggle('off', rule.shown === 0);
      shown += rule.shown;
    }

    let unfolded = 0;
    for (const rule of rules) {
      unfolded += rule.shown;
      rule.rule.open = plain ? rule.wasOpen : rule.shown > 0 && unfolded <= MOST_UNFOLDED;
    }

    none.hidden = shown > 0;
    status.textContent = plain ? `${total} findings` : `${shown} of ${total} findings`;
    keep(ask, plain);
  }

  // The filter in the address, so that it can be passed on; a place on the page keeps its own address.
  function keep(ask, plain) {
    const kept = new URLSearchParams();
    if (ask.verdicts.size !== verdicts.length) kept.set('verdict', [...ask.verdicts].join(','));
    if (ask.clause) kept.set('clause', ask.clause);
    if (ask.board !== '*') kept.set('board', ask.board);
    if (ask.text) kept.set('text', ask.text);
    if (!plain || location.hash.startsWith('#?')) history.replaceState(null, '', plain ? '#' : '#?' + kept);
  }

  function recall() {
    const kept = new URLSearchParams(location.hash.slice(2));
    const chosen = kept.get('verdict')?.split(',');
    verdicts.forEach(box => { box.checked = !chosen || chosen.includes(box.value); });
    form.elements.clause.value = kept.get('clause') ?? '';
    form.elements.board.value = kept.get('board') ?? '*';
    form.elements.text.value = kept.get('text') ?? '';
  }

  // A link to a finding that the filter hides shows everything again.
  function follow() {
    if (location.hash.startsWith('#?')) {
      recall();
      whenWhole(apply);
      return;
    }

    const target = reach(decodeURIComponent(location.hash.slice(1)));
    if (!target) return;
    if (target.closest('.off')) {
      form.reset();
      apply();
    }

    for (let at = target; at; at = at.parentElement) {
      if (at.tagName === 'DETAILS') at.open = true;
    }

    target.scrollIntoView();
  }

  let pause;
  form.addEventListener('input', event => {
    clearTimeout(pause);
    pause = setTimeout(whenWhole, event.target.type === 'search' ? 150 : 0, apply);
  });
  form.addEventListener('reset', () => setTimeout(whenWhole, 0, apply));
  form.addEventListener('submit', event => event.preventDefault());
  addEventListener('hashchange', follow);
  addEventListener('click', event => {
    const link = event.target.closest('a[href^="#"]');
    if (link) reach(link.getAttribute('href').slice(1));
  });
  addEventListener('beforeprint', putInAll);
  addEventListener('load', goOn);
  form.hidden = false;
  whenWhole(count);
  if (location.hash) follow();
})();
