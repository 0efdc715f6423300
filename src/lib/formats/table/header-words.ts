/**
 * What column names mean. Common practice of the field and of spreadsheets, in the languages a
 * laboratory's files are met in; every name is reduced by `normaliseName` before it is looked up.
 * Lists are read in the order of {@link wordClasses}: "relative frequency" is a share before it is
 * a frequency, "number of shots" a frequency before it is a number of anything.
 */
const list = (words: string) => words.split(/\s*,\s*|\s*\n\s*/).filter((word) => word !== '');

/** Whole names that a word-by-word look would misread. */
export const wholeNames: Record<string, string[]> = {
  frequency: list('f, h, fn, hn, f n, h n, fo, shot count, shot counts, n shots, nshots, times, how often'),
  shot: list('index, id, row, rep, repeat, trial, trial number, frame, image, nr, no, число, i'),
  count: list('counts per shot, count per shot, defects per shot, kinks per shot, anzahl pro schuss'),
  symbol: list(
    'n, k, x, value, values, outcome, wert, werte, valeur, valeurs, valor, valores, valore, valori'
  ),
  condition: list('time, zeit, temps, tiempo, tempo, tau, l'),
  share: list('p, p n, pn, error, err')
};

/** Words that settle a name wherever they stand in it. */
export const anyWord: Record<string, string[]> = {
  remark: list(`comment, comments, note, notes, remark, remarks, timestamp, datetime, bemerkung, bemerkungen,
    kommentar, commentaire, commentaires, remarque, nota, notas, comentario, commento, opmerking`),
  share:
    list(`relative, probability, probabilities, prob, expected, theory, theoretical, fitted, percent, percentage,
    cumulative, cumulated, sigma, std, standard, share, fraction, density, wahrscheinlichkeit, erwartet, relativ, kumuliert,
    dichte, probabilite, attendu, relatif, cumule, probabilidad, esperado, relativa, acumulada, probabilita, atteso`),
  frequency:
    list(`frequency, frequencies, freq, freqs, shots, occurrence, occurrences, observed, obs, repeats,
    repetitions, hits, weight, weights, runs, throws, intervals, realisations, realizations, samples, measurements,
    experiments, tally, multiplicity, haufigkeit, haufigkeiten, haeufigkeit, haeufigkeiten, frequenz, schusse,
    schuesse, messungen, wiederholungen, effectif, effectifs, frequence, frequences, tirs, mesures, frecuencia,
    frecuencias, disparos, medidas, frequenza, frequenze, occorrenze, spari, misure, frequencia, frequencias,
    frequentie, frequenties, frekvens, frekvenser, hyppighet, hyppigheder, frekvenssi, czestosc, liczebnosc, cetnost,
    gyakorisag, siklik, частота, частоты, выстрелов, 頻度, 度数, 回数, 频数, 频次, 频率, 次数, 빈도, 도수`),
  batch:
    list(`batch, batches, block, session, series, serie, lot, lote, charge, durchgang, lotto, partie, partij,
    партия, серия, バッチ, 批次, 배치`),
  run: list('run, lauf, messlauf'),
  trials: list('trials, sites, bonds, modes, qubits, length, platze, versuche, essais, ensayos, prove'),
  condition:
    list(`device, devices, chip, processor, machine, firmware, version, release, group, register, region, quench, hold, ramp, duration,
    delay, temperature, field, power, detuning, setting, setup, configuration, condition, label, dataset, operator,
    lab, laboratory, date, day, protocol, gerat, geraet, haltezeit, rampe, temperatur, dauer, appareil, dispositif,
    puce, gruppe, groupe, grupo, gruppo, groep, temperature, duree, dispositivo, aparato, temperatura, duracion, durata, apparaat, apparat, устройство,
    прибор, время, 装置, デバイス, 设备, 장치`),
  count:
    list(`defects, defect, kinks, kink, excitations, excitation, vortices, vortex, solitons, soliton, walls,
    events, successes, deaths, accidents, sixes, cells, particles, atoms, photons, ions, pairs, flips, errors, dice,
    defekte, defekt, fehler, knicke, unfalle, defauts, defaut, evenements, defectos, defecto, eventos, difetti,
    difetto, eventi, defeitos, defeito, defecten, defekter, feil, fejl, vikoja, defekty, hibak, hatalar,
    дефекты, дефектов, событий, 欠陥, 欠陥数, 缺陷, 缺陷数, 결함, 결함수`),
  shot: list(
    'shot, repetition, schuss, schussnummer, messung, tir, disparo, sparo, schot, skudd, выстрел, ショット, 샷'
  ),
  either:
    list(`count, counts, number, numbers, num, anzahl, zahl, nombre, nombres, numero, numeros, cantidad, conteo,
    comptage, comptages, compte, conteggio, conteggi, contagem, contagens, aantal, antal, antall, liczba, pocet,
    количество, 数, 個数, 数量, 计数, 個, 개수, 계수, szam, lukumaara, sayi, sayisi`)
};

/** Order in which the lists are asked. */
export const wordClasses = [
  'remark',
  'share',
  'frequency',
  'batch',
  'run',
  'trials',
  'condition',
  'count',
  'shot',
  'either'
] as const;

/** Labels of a closing row that sums the others. */
export const totalWords = new Set(
  list(
    'total, totals, sum, summe, gesamt, insgesamt, somme, suma, totale, totaal, somma, soma, всего, итого, 合計, 合计, 총계'
  )
);
