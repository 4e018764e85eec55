/* Draws the charts from the JSON beside them, and adds what a reader can do with a page: toggle,
   read values, copy, save, move a marker. Everything it shows is on the page without it. */
(function () {
  'use strict';

  var MINUS = '\u2212';
  var SUPER = '⁰¹²³⁴⁵⁶⁷⁸⁹';
  var TOP = 34;
  var BOTTOM = 46;
  var charts = {};

  function all(selector, root) {
    return Array.prototype.slice.call((root || document).querySelectorAll(selector));
  }

  function element(name, text, look) {
    var made = document.createElement(name);
    if (text !== undefined) { made.textContent = text; }
    if (look) { made.className = look; }
    return made;
  }

  function data(id) {
    return JSON.parse(document.getElementById('data-' + id).textContent);
  }

  function variable(name) {
    return getComputedStyle(document.documentElement).getPropertyValue('--' + name).trim();
  }

  function superscript(number) {
    return String(number).split('').map(function (c) {
      return c === '-' ? '⁻' : SUPER.charAt(+c);
    }).join('');
  }

  /* Numbers as the rest of the page writes them: full stop, true minus, no separators. */
  function text(value, digits) {
    if (value === null || value === undefined || !isFinite(value)) { return '–'; }
    var size = Math.abs(value);
    if (size !== 0 && (size < 1e-3 || size >= 1e6)) {
      var power = Math.floor(Math.log10(size) + 1e-12);
      var mantissa = +(value / Math.pow(10, power)).toPrecision(Math.max(1, digits - 1));
      return (mantissa === 1 ? '' : mantissa + ' × ') + '10' + superscript(power);
    }
    return String(+value.toPrecision(digits)).replace('-', MINUS);
  }

  function withUnit(value, unit) {
    return unit ? value + '\u00a0' + unit : value;
  }

  /* ---- charts ---- */

  function lineColour(role) {
    if (role === 'reflected') { return variable('muted'); }
    return variable(role);
  }

  function labelColour(role) {
    if (role.indexOf('sub') === 0 || role === 'exit') { return variable('on-' + role); }
    return variable('on-loss');
  }

  /* The smallest round step that gives at most about so many ticks. */
  function roundStep(low, high, wanted) {
    var raw = (high - low) / wanted;
    var power = Math.pow(10, Math.floor(Math.log10(raw)));
    return [1, 2, 2.5, 5, 10].filter(function (m) { return m * power >= raw * 0.999; })[0] * power;
  }

  function onStep(value, step) {
    return step === null || Math.abs(value / step - Math.round(value / step)) < 1e-6;
  }

  /* A round step that starts and ends on the axis' own ends, where there is one. */
  function evenStep(low, high) {
    var steps = [5, 7, 10].map(function (wanted) { return roundStep(low, high, wanted); });
    return steps.filter(function (step) { return onStep(low, step) && onStep(high, step); })[0] || steps[0];
  }

  function axis(spec, index, width) {
    var across = index === 0;
    var step = spec.logarithmic ? null : across ? roundStep(spec.min, spec.max, width > 560 ? 9 : 4) : evenStep(spec.min, spec.max);
    return {
      type: spec.logarithmic ? 'log' : 'value',
      min: spec.min,
      max: spec.max,
      name: spec.unit ? spec.label + ', ' + spec.unit : spec.label,
      nameLocation: across ? 'middle' : 'end',
      nameGap: across ? 30 : 12,
      nameTextStyle: { color: variable('muted'), align: across ? 'center' : 'left', padding: across ? 0 : [0, 0, 0, -44] },
      axisLabel: { color: variable('muted'), hideOverlap: true, showMinLabel: onStep(spec.min, step), showMaxLabel: onStep(spec.max, step), formatter: function (v) { return text(v, 5); } },
      axisLine: { show: across, onZero: false, lineStyle: { color: variable('muted') } },
      axisTick: { show: across, lineStyle: { color: variable('muted') } },
      splitLine: { show: !across, lineStyle: { color: variable('grid') } },
      interval: step !== null && onStep(spec.min, step) ? step : undefined
    };
  }

  /* Areas add up only along an axis of categories; the grid of wavelengths is even. */
  function categories(chart, width) {
    var made = axis(chart.x, 0, width);
    var step = roundStep(chart.x.min, chart.x.max, width > 560 ? 9 : 4);
    var shown = function (index) { return onStep(chart.xs[index], step); };
    return Object.assign(made, {
      type: 'category', data: chart.xs, boundaryGap: false, min: undefined, max: undefined, interval: undefined,
      axisTick: { show: true, interval: shown, lineStyle: { color: variable('muted') } },
      axisLabel: Object.assign(made.axisLabel, { interval: shown, showMinLabel: undefined, showMaxLabel: undefined, hideOverlap: false,
        formatter: function (v) { return text(+v, 5); } })
    });
  }

  function pairs(chart, row) {
    if (chart.kind === 'STACK') { return row.values.map(function (v) { return Math.max(0, v); }); }
    return chart.xs.map(function (x, i) {
      var y = row.values[i];
      return [x, chart.y.logarithmic && !(y > 0) ? null : y];
    });
  }

  /* Where an area is thick enough for its name over the whole length of the name, near its middle. */
  function labelSpot(chart, index, width) {
    var values = chart.series[index].values;
    var half = Math.ceil(clip(chart.series[index].label, 34).length * 3.6 / (width - 74) * chart.xs.length) + 1;
    var weight = 0;
    var centre = 0;
    values.forEach(function (v, i) { weight += v; centre += v * i; });
    centre /= weight || 1;
    var best = null;
    for (var i = half; i < values.length - half; i++) {
      var low = 0;
      var high = 1;
      for (var k = i - half; k <= i + half; k++) {
        var base = 0;
        for (var s = 0; s < index; s++) { base += chart.series[s].values[k] || 0; }
        low = Math.max(low, base);
        high = Math.min(high, base + (values[k] || 0));
      }
      var score = Math.min(high - low, 0.25) - 0.1 * Math.abs(i - centre) / values.length;
      if (high - low > 0.065 && (!best || score > best.score)) {
        best = { score: score, coord: [i, (low + high) / 2] };
      }
    }
    return best && best.coord;
  }

  function series(chart, row, index, width, shift) {
    var wide = width > 560;
    var stacked = chart.kind === 'STACK';
    var colour = stacked ? variable(row.role) : lineColour(row.role);
    var made = {
      id: 's' + index,
      name: row.label,
      type: chart.kind === 'POINTS' ? 'scatter' : 'line',
      data: pairs(chart, row),
      symbol: chart.kind === 'POINTS' ? 'circle' : 'none',
      symbolSize: row.role === 'muted' ? 7 : 13,
      z: row.role === 'muted' ? 2 : 3,
      itemStyle: { color: colour, opacity: 1 },
      lineStyle: { width: stacked ? 0.8 : 2, color: stacked ? variable('paper') : colour, type: row.dashed ? [6, 4] : 'solid' },
      animation: false,
      emphasis: { disabled: true }
    };
    if (stacked) {
      var spot = labelSpot(chart, index, width);
      made.stack = 'light';
      made.stackStrategy = 'all';
      made.areaStyle = { color: colour, opacity: 1 };
      if (spot && wide) {
        made.markPoint = { symbol: 'circle', symbolSize: 0.1, silent: true, animation: false,
          data: [{ coord: spot, label: { show: true, color: labelColour(row.role), fontSize: 12, formatter: clip(row.label, 34) } }] };
      }
    } else if (chart.kind === 'POINTS' && made.data.filter(function (p) { return p[1] !== null; }).length === 1) {
      made.label = { show: true, position: 'right', distance: 8, color: variable('ink'), formatter: clip(row.label, 20) };
    } else if (wide && chart.kind === 'LINES' && shift !== null) {
      made.endLabel = { show: true, color: row.role.indexOf('sub') === 0 ? variable('ink-' + row.role) : colour, formatter: clip(row.label, 20), distance: 8, offset: [0, shift] };
    }
    return made;
  }

  function clip(name, most) {
    var letters = Array.from(name);
    return letters.length > most ? letters.slice(0, most - 1).join('') + '…' : name;
  }

  function marks(chart) {
    return {
      silent: true, symbol: 'none', animation: false,
      lineStyle: { color: variable('ink'), type: [5, 3], width: 1.2 },
      label: { color: variable('ink'), formatter: function (p) { return p.name; } },
      data: chart.marks.map(function (mark) { return { name: mark.label, xAxis: mark.x }; })
    };
  }

  function tooltip(chart) {
    return {
      trigger: chart.kind === 'POINTS' ? 'item' : 'axis',
      confine: true,
      backgroundColor: variable('card'),
      borderColor: variable('line'),
      textStyle: { color: variable('ink'), fontSize: 13 },
      axisPointer: { lineStyle: { color: variable('muted') } },
      formatter: function (points) {
        var list = Array.isArray(points) ? points : [points];
        var box = element('div');
        var x = chart.xs[list[0].dataIndex];
        box.appendChild(element('strong', chart.x.label + ' ' + withUnit(text(x, 5), chart.x.unit)));
        list.slice().reverse().forEach(function (point) {
          var y = chart.series[point.seriesIndex].values[point.dataIndex];
          if (y !== null && y !== undefined) {
            box.appendChild(element('div', clip(point.seriesName, 40) + ' ' + withUnit(text(y, 4), chart.y.unit)));
          }
        });
        return box;
      }
    };
  }

  /* How far to move each label at a line's end so that no two overlap. */
  function endShifts(chart, height) {
    var shifts = chart.series.map(function () { return 0; });
    var ends = [];
    chart.series.forEach(function (row, index) {
      var known = row.values.filter(function (v) { return v !== null; });
      if (known.length && !chart.y.logarithmic) {
        ends.push({ index: index, y: (1 - (known[known.length - 1] - chart.y.min) / (chart.y.max - chart.y.min)) * height });
      }
    });
    ends.sort(function (a, b) { return a.y - b.y; });
    var room = 15;
    var bottom = height - 4;
    var at = ends.map(function (end) { return end.y; });
    for (var i = 1; i < at.length; i++) { at[i] = Math.max(at[i], at[i - 1] + room); }
    for (var j = at.length - 1; j >= 0; j--) {
      at[j] = Math.min(at[j], bottom);
      bottom = at[j] - room;
    }
    ends.forEach(function (end, k) { shifts[end.index] = at[k] - end.y; });
    /* Where the ends bunch, names far from their lines would mislead; the legend has them. */
    var bunched = shifts.some(function (shift) { return Math.abs(shift) > 24; });
    return shifts.map(function (shift) { return bunched ? null : shift; });
  }

  function option(chart, width, height) {
    var wide = width > 560;
    var shifts = endShifts(chart, height - TOP - BOTTOM);
    var rows = chart.series.map(function (row, index) { return series(chart, row, index, width, shifts[index]); });
    if (rows.length && chart.marks.length) { rows[0].markLine = marks(chart); }
    return {
      animation: false,
      textStyle: { fontFamily: getComputedStyle(document.body).fontFamily, color: variable('ink') },
      grid: { left: 58, right: wide && chart.kind === 'LINES' && shifts[0] !== null ? 158 : 16, top: TOP, bottom: BOTTOM },
      legend: { show: false },
      tooltip: tooltip(chart),
      xAxis: chart.kind === 'STACK' ? categories(chart, width) : axis(chart.x, 0, width),
      yAxis: axis(chart.y, 1, width),
      series: rows
    };
  }

  function draw(figure) {
    var id = figure.getAttribute('data-chart');
    var place = figure.querySelector('.live');
    var chart = data(id);
    figure.classList.add('is-live');
    place.hidden = false;
    var live = echarts.getInstanceByDom(place) || echarts.init(place, null, { renderer: 'svg' });
    live.setOption(option(chart, place.clientWidth, place.clientHeight), true);
    charts[id] = { live: live, chart: chart, figure: figure };
    toggles(figure, live);
    if (figure.hasAttribute('data-found')) { slider(figure, live, chart); }
  }

  function toggles(figure, live) {
    all('.key', figure).forEach(function (key) {
      var name = key.getAttribute('data-series');
      if (key.tagName === 'BUTTON') {
        if (key.getAttribute('aria-pressed') === 'false') { live.dispatchAction({ type: 'legendUnSelect', name: name }); }
        return;
      }
      var button = element('button', undefined, 'key');
      button.type = 'button';
      button.setAttribute('data-series', name);
      button.setAttribute('aria-pressed', 'true');
      while (key.firstChild) { button.appendChild(key.firstChild); }
      button.addEventListener('click', function () {
        var shown = button.getAttribute('aria-pressed') === 'true';
        button.setAttribute('aria-pressed', String(!shown));
        echarts.getInstanceByDom(figure.querySelector('.live'))
          .dispatchAction({ type: shown ? 'legendUnSelect' : 'legendSelect', name: name });
      });
      key.parentNode.replaceChild(button, key);
    });
  }

  /* ---- what if ---- */

  function between(xs, values, x) {
    for (var i = 1; i < xs.length; i++) {
      if (x <= xs[i]) {
        var part = (x - xs[i - 1]) / (xs[i] - xs[i - 1]);
        return values[i - 1] + part * (values[i] - values[i - 1]);
      }
    }
    return values[values.length - 1];
  }

  function slider(figure, live, chart) {
    var box = figure.querySelector('.slide');
    var input = box.querySelector('input');
    var found = +figure.getAttribute('data-found');
    var decimals = +figure.getAttribute('data-decimals');
    var weakest = figure.getAttribute('data-weakest') === 'true';
    var first = box.hidden;
    box.hidden = false;
    if (first) {
      input.min = chart.x.min;
      input.max = chart.x.max;
      input.step = Math.pow(10, -decimals);
      input.value = found;
      box.querySelector('button').addEventListener('click', function () { input.value = found; show(); });
      input.addEventListener('input', show);
    }
    function show() {
      var x = +input.value;
      live.setOption({ series: [{ id: 's0', markLine: {
        silent: true, symbol: 'none', animation: false,
        lineStyle: { color: variable('ink'), width: 1.5, type: 'solid' },
        label: { show: false },
        data: [{ xAxis: x }] } }] });
      read(box, chart, x, found, decimals, weakest);
    }
    var dragging = false;
    function move(event) {
      if (dragging && live.containPixel('grid', [event.offsetX, event.offsetY])) {
        input.value = live.convertFromPixel({ xAxisIndex: 0 }, event.offsetX);
        show();
      }
    }
    if (first) {
      live.getZr().on('mousedown', function (event) { dragging = true; move(event); });
      live.getZr().on('mousemove', move);
      live.getZr().on('globalout', function () { dragging = false; });
      document.addEventListener('mouseup', function () { dragging = false; });
    }
    show();
  }

  /* With two decimals, a sign, and no negative zero. */
  function signed(value) {
    var size = Math.abs(value).toFixed(2);
    return +size === 0 ? size : (value > 0 ? '+' : MINUS) + size;
  }

  function aim(chart, weakest, x) {
    var here = chart.series.map(function (row) { return between(chart.xs, row.values, x); });
    return weakest ? Math.min.apply(null, here) : here[here.length - 1];
  }

  function read(box, chart, x, found, decimals, weakest) {
    var parts = chart.series.map(function (row) {
      return clip(row.label, 24) + ' ' + between(chart.xs, row.values, x).toFixed(2).replace('-', MINUS);
    });
    var change = aim(chart, weakest, x) - aim(chart, weakest, found);
    var at = withUnit(x.toFixed(decimals), chart.x.unit);
    var spoken = at + ': ' + parts.join(', ') + '; ' + withUnit(signed(change), chart.y.unit) + ' against found (interpolated)';
    box.querySelector('output').textContent = spoken;
    box.querySelector('input').setAttribute('aria-valuetext', spoken);
  }

  /* ---- tables and pictures to take away ---- */

  function quoted(cell) {
    var value = cell === null || cell === undefined ? '' : String(cell);
    return /[",\n\r]/.test(value) ? '"' + value.replace(/"/g, '""') + '"' : value;
  }

  function named(label, unit) {
    return unit ? label + ' (' + unit + ')' : label;
  }

  function rowsOf(table) {
    var id = table.getAttribute('data-chart-data');
    if (id && document.getElementById('data-' + id)) {
      var chart = data(id);
      var rows = chart.xs.map(function (x, i) {
        return [x].concat(chart.series.map(function (row) { return row.values[i]; }));
      });
      var head = [named(chart.x.label, chart.x.unit)].concat(chart.series.map(function (row) { return named(row.label, chart.y.unit); }));
      return [head].concat(rows);
    }
    return all('tr', table).map(function (tr) {
      return all('th,td', tr).map(function (cell) { return cell.textContent.trim().split(MINUS).join('-').split('\u00a0').join(' '); });
    });
  }

  function save(name, type, content) {
    var link = element('a');
    var address = URL.createObjectURL(new Blob([content], { type: type }));
    link.href = address;
    link.download = name;
    link.click();
    setTimeout(function () { URL.revokeObjectURL(address); }, 1000);
  }

  function copy(content, button) {
    var area = element('textarea');
    area.value = content;
    area.setAttribute('readonly', '');
    area.className = 'skip';
    document.body.appendChild(area);
    area.select();
    var done = false;
    try { done = document.execCommand('copy'); } catch (refused) { done = false; }
    document.body.removeChild(area);
    var label = button.textContent;
    button.textContent = done ? 'copied' : 'copying was refused';
    setTimeout(function () { button.textContent = label; button.focus(); }, 1200);
  }

  function action(place, label, subject, act) {
    var button = element('button', label);
    button.type = 'button';
    button.setAttribute('aria-label', label + ': ' + subject);
    button.addEventListener('click', function () { act(button); });
    place.appendChild(button);
  }

  function tableTools(place) {
    var id = place.getAttribute('data-table');
    var table = document.getElementById(id);
    var subject = clip(table.getAttribute('aria-label'), 80);
    action(place, 'Copy', subject, function (button) {
      copy(rowsOf(table).map(function (row) { return row.join('\t'); }).join('\n'), button);
    });
    action(place, 'CSV', subject, function () {
      save(id + '.csv', 'text/csv', rowsOf(table).map(function (row) { return row.map(quoted).join(','); }).join('\n') + '\n');
    });
  }

  var INLINED = ['fill', 'stroke', 'stroke-width', 'stroke-dasharray', 'stroke-linecap', 'stroke-linejoin',
    'opacity', 'font-family', 'font-size', 'font-weight', 'paint-order'];

  function standalone(svg) {
    var twin = svg.cloneNode(true);
    var from = all('rect,line,path,text', svg);
    all('rect,line,path,text', twin).forEach(function (shape, i) {
      var style = getComputedStyle(from[i]);
      INLINED.forEach(function (name) { shape.setAttribute(name, style.getPropertyValue(name)); });
      shape.removeAttribute('class');
    });
    var size = svg.getAttribute('viewBox').split(' ');
    twin.setAttribute('width', size[2]);
    twin.setAttribute('height', size[3]);
    return '<?xml version="1.0" encoding="UTF-8"?>\n' + new XMLSerializer().serializeToString(twin);
  }

  function pictureTools(place) {
    var id = place.getAttribute('data-save');
    var figure = document.getElementById(id);
    action(place, 'Save as SVG', id.replace('fig-', ''), function () {
      save(id + '.svg', 'image/svg+xml', standalone(figure.querySelector('.drawing')));
    });
  }

  function copyTools(place) {
    var source = document.getElementById(place.getAttribute('data-copy'));
    action(place, 'Copy', source.getAttribute('aria-label'), function (button) { copy(source.textContent, button); });
  }

  /* The numbers of several charts over one x, side by side. */
  function together(place) {
    var ids = place.getAttribute('data-together').split(' ');
    var file = place.getAttribute('data-file');
    action(place, place.getAttribute('data-label'), file, function () {
      var parts = ids.map(data);
      var head = [named(parts[0].x.label, parts[0].x.unit)];
      parts.forEach(function (chart) {
        chart.series.forEach(function (row) { head.push(chart.title + ' ' + row.label); });
      });
      var rows = parts[0].xs.map(function (x, i) {
        return parts.reduce(function (line, chart) {
          return line.concat(chart.series.map(function (row) { return row.values[i]; }));
        }, [x]);
      });
      save(file, 'text/csv', [head].concat(rows).map(function (row) { return row.map(quoted).join(','); }).join('\n') + '\n');
    });
  }

  /* ---- the glossary at the pointer and at the focus ---- */

  function glossary() {
    var box = element('div', undefined, 'gloss');
    var leaving = 0;
    box.id = 'gloss';
    box.setAttribute('role', 'tooltip');
    box.hidden = true;
    document.body.appendChild(box);
    function hide() {
      box.hidden = true;
      all('.term[aria-describedby]').forEach(function (link) { link.removeAttribute('aria-describedby'); });
    }
    function later() { leaving = setTimeout(hide, 200); }
    function stay() { clearTimeout(leaving); }
    function show(link) {
      stay();
      hide();
      var entry = document.getElementById(link.getAttribute('href').slice(1));
      box.textContent = entry.querySelector('dd').textContent;
      box.hidden = false;
      var at = link.getBoundingClientRect();
      var room = document.documentElement.clientWidth - box.offsetWidth - 8;
      box.style.left = Math.max(8, Math.min(at.left, room)) + window.scrollX + 'px';
      var below = at.bottom + box.offsetHeight + 8 < window.innerHeight;
      box.style.top = (below ? at.bottom + 6 : at.top - box.offsetHeight - 6) + window.scrollY + 'px';
      link.setAttribute('aria-describedby', 'gloss');
    }
    all('.term').forEach(function (link) {
      link.removeAttribute('title');
      link.addEventListener('mouseenter', function () { show(link); });
      link.addEventListener('focus', function () { show(link); });
      link.addEventListener('mouseleave', later);
      link.addEventListener('blur', hide);
    });
    box.addEventListener('mouseenter', stay);
    box.addEventListener('mouseleave', later);
    document.addEventListener('keydown', function (event) { if (event.key === 'Escape') { hide(); } });
  }

  /* ---- the page ---- */

  function follow() {
    if (!('IntersectionObserver' in window)) { return; }
    var observer = new IntersectionObserver(function (entries) {
      entries.forEach(function (entry) {
        if (entry.isIntersecting) {
          all('.contents a').forEach(function (link) {
            var here = link.getAttribute('href') === '#' + entry.target.id;
            link.classList.toggle('here', here);
            if (here) { link.setAttribute('aria-current', 'true'); } else { link.removeAttribute('aria-current'); }
          });
        }
      });
    }, { rootMargin: '-20% 0px -70% 0px' });
    all('main > section').forEach(function (section) { observer.observe(section); });
  }

  /* What a link leads to may stand in something folded. */
  function unfolding() {
    document.addEventListener('click', function (event) {
      var link = event.target.closest && event.target.closest('a[href^="#"]');
      var target = link && document.getElementById(link.getAttribute('href').slice(1));
      for (var fold = target && target.closest('details'); fold; fold = fold.parentNode.closest('details')) {
        fold.open = true;
      }
    });
  }

  function printing() {
    var opened = [];
    window.addEventListener('beforeprint', function () {
      opened = all('details.boxed:not([open])');
      opened.forEach(function (fold) { fold.open = true; });
    });
    window.addEventListener('afterprint', function () {
      opened.forEach(function (fold) { fold.open = false; });
    });
  }

  function drawAll() {
    var waiting = all('[data-chart]');
    function next() {
      var figure = waiting.shift();
      if (!figure) {
        document.documentElement.setAttribute('data-drawn', 'all');
        return;
      }
      draw(figure);
      setTimeout(next, 0);
    }
    next();
  }

  function resized() {
    Object.keys(charts).forEach(function (id) {
      var known = charts[id];
      known.live.resize();
      draw(known.figure);
    });
  }

  var timer = 0;
  window.addEventListener('resize', function () { clearTimeout(timer); timer = setTimeout(resized, 150); });
  if (window.matchMedia) {
    window.matchMedia('(prefers-color-scheme: dark)').addEventListener('change', resized);
  }
  all('[data-save]').forEach(pictureTools);
  all('[data-table]').forEach(tableTools);
  all('[data-copy]').forEach(copyTools);
  all('[data-together]').forEach(together);
  glossary();
  follow();
  unfolding();
  printing();
  drawAll();
})();
