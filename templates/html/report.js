// Filters the findings. Without this script the page is complete: all findings are there, and nothing else depends on it.
(() => {
  'use strict';
  const form = document.querySelector('.filter');
  const total = document.querySelectorAll('.f').length;
  const verdicts = [...form.elements.verdict];
  const status = form.querySelector('[role=status]');
  const none = document.querySelector('.none');
  const MOST_UNFOLDED = 400;
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
      apply();
      return;
    }

    const target = document.getElementById(decodeURIComponent(location.hash.slice(1)));
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
    pause = setTimeout(apply, event.target.type === 'search' ? 150 : 0);
  });
  form.addEventListener('reset', () => setTimeout(apply));
  form.addEventListener('submit', event => event.preventDefault());
  addEventListener('hashchange', follow);
  form.hidden = false;
  status.textContent = `${total} findings`;
  if (location.hash) follow();
})();
