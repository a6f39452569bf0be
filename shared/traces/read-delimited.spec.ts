import fc from 'fast-check';
import { readDelimited } from './read-delimited';
import { ReadingError } from './reading-error';

interface TableForm {
  readonly delimiter?: string;
  readonly decimalMark?: string;
  /** Divides the frequencies in Hz. */
  readonly unitHz?: number;
  readonly points?: number;
  readonly levels?: number;
}

/** Rows of 150 kHz upwards in steps of 4.5 kHz; level k of point i is 40 + k + (i mod 7) / 10 dB. */
function table({ delimiter = ',', decimalMark = '.', unitHz = 1, points = 20, levels = 1 }: TableForm = {}): string {
  const rows = Array.from({ length: points }, (_, i) => {
    const numbers = [String((150_000 + 4500 * i) / unitHz)];
    for (let k = 0; k < levels; k++) numbers.push((40 + k + (i % 7) / 10).toFixed(1));
    return numbers.map((number) => number.replace('.', decimalMark)).join(delimiter);
  });
  return rows.join('\n') + '\n';
}

function bytesOf(text: string, encoding: 'utf8' | 'latin1' = 'utf8'): Uint8Array {
  return new Uint8Array(Buffer.from(text, encoding));
}

function faultOf(content: string | Uint8Array, options = {}): ReadingError {
  try {
    readDelimited(typeof content === 'string' ? bytesOf(content) : content, options);
  } catch (error) {
    if (error instanceof ReadingError) return error;
    throw error;
  }
  throw new Error('The file was read.');
}

const heading = 'Frequency [Hz],Level [dBuV]\n';

describe('readDelimited', () => {
  describe('forms of tables', () => {
    it.each([',', ';', '\t'])('reads a table delimited by %j with decimal point', (delimiter) => {
      const text = `Frequency [MHz]${delimiter}Level [dBuV]\n${table({ delimiter, unitHz: 1e6 })}`;
      const reading = readDelimited(bytesOf(text));
      expect(reading).toMatchObject({ delimiter, decimalMark: '.', frequencyUnit: 'MHz', inferred: [] });
      expect([...reading.frequenciesHz.subarray(0, 3)]).toEqual([150_000, 154_500, 159_000]);
      expect(reading.frequenciesHz).toHaveLength(20);
      expect(reading.traces).toHaveLength(1);
      expect(reading.traces[0]).toMatchObject({ name: 'Level', levelUnit: 'dBuV' });
      expect([...reading.traces[0].levelsDbuv.subarray(0, 2)]).toEqual([40, Math.fround(40.1)]);
    });

    it.each([';', '\t'])('reads a table delimited by %j with decimal comma', (delimiter) => {
      const text = `f [kHz]${delimiter}Level [dBuV]\n${table({ delimiter, decimalMark: ',', unitHz: 1e3 })}`;
      const reading = readDelimited(bytesOf(text));
      expect(reading).toMatchObject({ delimiter, decimalMark: ',', frequencyUnit: 'kHz' });
      expect(reading.frequenciesHz[1]).toBe(154_500);
      expect(reading.traces[0].levelsDbuv[1]).toBe(Math.fround(40.1));
    });

    it('finds the decimal mark even where the first rows have none', () => {
      const whole = Array.from({ length: 30 }, (_, i) => `${150 + i};${40 + (i % 3)}`).join('\n');
      const { decimalMark, frequenciesHz } = readDelimited(bytesOf(`f [kHz];L [dBuV]\n${whole}\n180,5;41,5\n`));
      expect(decimalMark).toBe(',');
      expect(frequenciesHz.at(-1)).toBe(180_500);
    });

    it('reads exponents', () => {
      const text = table().replace(/^(\d+),(.*)$/gm, (_row, hz: string, level: string) =>
        [Number(hz).toExponential(6), Number(level).toExponential(4)].join(','),
      );
      expect([...readDelimited(bytesOf(heading + text)).frequenciesHz]).toEqual([
        ...readDelimited(bytesOf(heading + table())).frequenciesHz,
      ]);
    });

    it.each([
      ['CR LF', '\r\n'],
      ['CR', '\r'],
    ])('reads line ends of %s', (_name, end) => {
      const reading = readDelimited(bytesOf((heading + table()).replace(/\n/g, end)));
      expect(reading.frequenciesHz).toHaveLength(20);
    });

    it('reads a last row without line end, and blank lines behind it', () => {
      expect(readDelimited(bytesOf((heading + table()).trimEnd())).frequenciesHz).toHaveLength(20);
      expect(readDelimited(bytesOf(`${heading}${table()}\n  \r\n\u001a`)).frequenciesHz).toHaveLength(20);
    });

    it('reads a table whose rows all end with a delimiter', () => {
      const text = (heading + table()).replace(/\n/g, ',\n');
      expect(readDelimited(bytesOf(text)).traces).toHaveLength(1);
    });

    it('reads UTF-8 with and without mark, and Latin-1, with either micro sign', () => {
      const text = `Frequency [Hz],Level [dB\u00b5V]\n${table()}`;
      for (const bytes of [
        bytesOf(text),
        bytesOf(`\ufeff${text}`),
        bytesOf(text, 'latin1'),
        bytesOf(text.replace('\u00b5', '\u03bc')),
      ]) {
        expect(readDelimited(bytes).traces[0].levelUnit).toBe('dBuV');
      }
    });
  });

  describe('units', () => {
    // 0 dBm in 50 ohm is 106.99 dBuV (handbook value); dBmV + 60 by definition.
    it('brings dBm and dBmV to dBuV at 50 ohm', () => {
      const of = (unit: string): number =>
        readDelimited(bytesOf(`Frequency [Hz],Level [${unit}]\n${table()}`)).traces[0].levelsDbuv[0];
      expect(of('dBm')).toBeCloseTo(40 + 106.9897, 4);
      expect(of('dBmV')).toBe(100);
    });

    it('takes units from a row below the names, from the preamble, or from the sender', () => {
      const unitRow = readDelimited(bytesOf(`Frequency;QP\nMHz;dB\u00b5V\n${table({ delimiter: ';', unitHz: 1e6 })}`));
      const above = readDelimited(bytesOf(`X-Axis Unit: MHz\nY-Axis Unit: dBm\n${table({ unitHz: 1e6 })}`));
      const given = readDelimited(bytesOf(table({ unitHz: 1e6 })), { frequencyUnit: 'MHz', levelUnit: 'dBm' });
      expect(unitRow.traces[0]).toMatchObject({ name: 'QP', detector: 'QP', levelUnit: 'dBuV' });
      for (const { frequenciesHz, frequencyUnit, traces } of [above, given]) {
        expect(frequencyUnit).toBe('MHz');
        expect(frequenciesHz[1]).toBe(154_500);
        expect(traces[0].levelUnit).toBe('dBm');
      }
    });

    it('infers the frequency unit from a span that only one unit fits, and says so', () => {
      const { frequencyUnit, inferred, frequenciesHz } = readDelimited(bytesOf(table({ points: 6634, unitHz: 1e6 })), {
        levelUnit: 'dBuV',
      });
      expect(frequencyUnit).toBe('MHz');
      expect(frequenciesHz.at(-1)).toBe(29_998_500);
      expect(inferred).toEqual([
        {
          what: 'frequency unit',
          value: 'MHz',
          why: 'the file names none, and only MHz puts 0.15 to 29.9985 between 9 kHz and 1 GHz',
        },
      ]);
    });

    it('asks for a frequency unit that the span leaves open', () => {
      const fault = faultOf(table({ unitHz: 1e6 }), { levelUnit: 'dBuV' });
      expect(fault).toMatchObject({ line: 1, column: 1, found: 'frequencies from 0.15 to 0.2355 without a unit' });
      expect(fault.needs).toBe('frequencyUnit');
    });

    it('asks for a level unit that nobody states: it is never inferred', () => {
      const fault = faultOf(`Frequency [Hz],Level\n${table()}`);
      expect(fault).toMatchObject({ line: 1, column: 2, found: 'no unit of level', needs: 'levelUnit' });
      expect(fault.message).toBe(
        'Line 1, column 2: found no unit of level, expected dBuV, dBm or dBmV, in the file or given with it. ' +
          'Choose the level unit for this file, or name it in the heading.',
      );
    });

    it('refuses units that contradict the sender or each other', () => {
      expect(faultOf(heading + table(), { levelUnit: 'dBm' })).toMatchObject({
        line: 1,
        column: 2,
        found: 'the level unit dBuV',
        expected: 'dBm as given with the file',
      });
      expect(faultOf(heading + table(), { frequencyUnit: 'kHz' })).toMatchObject({
        line: 1,
        column: 1,
        found: 'the frequency unit Hz',
        expected: 'kHz as given with the file',
      });
      expect(faultOf(`Frequency unit: kHz\n${heading}${table()}`)).toMatchObject({
        line: 1,
        found: 'the frequency unit kHz',
        expected: 'Hz as stated in line 2',
      });
    });

    it.each(['dBuA', 'dBuV/m', 'dBpW', 'mV'])('refuses levels in %s', (unit) => {
      const fault = faultOf(`Frequency [Hz],Level [${unit}]\n${table()}`);
      expect(fault).toMatchObject({ line: 1, column: 2, expected: 'dBuV, dBm or dBmV' });
      expect(fault.found).toContain(unit);
    });
  });

  describe('headings and preamble', () => {
    it('reads settings, keys and values above the table', () => {
      const text =
        '# Bench export\n! RBW: 9 kHz\nDetector,QP\nAtten = 10 dB\n"Operator, shift","B, late"\n\n' + heading + table();
      const { preamble, settings, traces } = readDelimited(bytesOf(text));
      expect(settings).toEqual({ rbwHz: 9000, detector: 'QP', attenuationDb: 10 });
      expect(traces[0].detector).toBe('QP');
      expect(preamble).toEqual([
        { line: 1, key: '', value: 'Bench export' },
        { line: 2, key: 'RBW', value: '9 kHz' },
        { line: 3, key: 'Detector', value: 'QP' },
        { line: 4, key: 'Atten', value: '10 dB' },
        { line: 5, key: expect.stringContaining('Operator') as string, value: expect.any(String) as string },
      ]);
    });

    it.each([
      ['RBW;9;kHz', 9000],
      ['RBW [kHz];9', 9000],
      ['Resolution Bandwidth: 9,000E+03 Hz', 9000],
      ['RBW;9000', 9000],
      ['RBW;9', undefined],
      ['IF Bandwidth = 0.2 kHz', 200],
    ])('reads the bandwidth of %j as %s Hz', (line, rbwHz) => {
      const text = `${line}\nf [Hz];QP [dBuV]\n${table({ delimiter: ';' })}`;
      expect(readDelimited(bytesOf(text)).settings.rbwHz).toBe(rbwHz);
    });

    it('takes a setting right above a table of two columns for a setting', () => {
      const { settings, preamble } = readDelimited(bytesOf(`Unit,dBuV\nDetector,AV\n${table({ points: 6634 })}`));
      expect(settings.detector).toBe('AV');
      expect(preamble).toHaveLength(2);
    });

    it('takes a start frequency right above the table for a setting', () => {
      const { preamble, frequencyUnit } = readDelimited(
        bytesOf(`Unit;dBuV\nStart frequency;0.15 MHz\n${table({ delimiter: ';', points: 6634 })}`),
      );
      expect(preamble[1]).toEqual({ line: 2, key: 'Start frequency', value: '0.15 MHz' });
      expect(frequencyUnit).toBe('Hz');
    });

    it('reads a table below 60 lines', () => {
      const lines = Array.from({ length: 60 }, (_, i) => `Setting ${i};${i}`).join('\n');
      const reading = readDelimited(bytesOf(`${lines}\nf [Hz];QP [dBuV]\n${table({ delimiter: ';' })}`));
      expect(reading.preamble).toHaveLength(60);
      expect(reading.frequenciesHz).toHaveLength(20);
    });

    it('reads several traces with their names, detectors and lines', () => {
      const names = 'Frequency [Hz];QP L [dBuV];AV_L [dBuV];Max Peak N [dBm]\n';
      const { traces } = readDelimited(bytesOf(names + table({ delimiter: ';', levels: 3 })));
      expect(traces.map(({ levelsDbuv, ...rest }) => ({ ...rest, first: levelsDbuv[0] }))).toEqual([
        { name: 'QP L', levelUnit: 'dBuV', detector: 'QP', line: 'L', first: 40 },
        { name: 'AV_L', levelUnit: 'dBuV', detector: 'AV', line: 'L', first: 41 },
        {
          name: 'Max Peak N',
          levelUnit: 'dBm',
          detector: 'PK',
          line: 'N',
          first: Math.fround(42 + 10 * Math.log10(5e10)),
        },
      ]);
    });

    it('numbers traces without a name, or names them as the preamble does', () => {
      const bare = readDelimited(bytesOf(`Unit;dBuV\n${table({ delimiter: ';', levels: 2, points: 6634 })}`));
      expect(bare.traces.map(({ name }) => name)).toEqual(['Trace 1', 'Trace 2']);
      const text = `Trace 1: QP L1\nTrace 2: AV L1\nUnits: Hz, dBuV\n${table({ delimiter: ';', levels: 2 })}`;
      expect(readDelimited(bytesOf(text)).traces).toMatchObject([
        { name: 'QP L1', detector: 'QP', line: 'L1' },
        { name: 'AV L1', detector: 'AV', line: 'L1' },
      ]);
    });

    it('takes L for a conductor beside N, and for the level alone', () => {
      const both = readDelimited(bytesOf(`f [Hz];L [dBuV];N [dBuV]\n${table({ delimiter: ';', levels: 2 })}`));
      const alone = readDelimited(bytesOf(`f [Hz];L [dBuV]\n${table({ delimiter: ';' })}`));
      expect(both.traces.map(({ line }) => line)).toEqual(['L', 'N']);
      expect(alone.traces[0].line).toBeUndefined();
    });

    it('leaves out columns that are no levels, and says so', () => {
      const names = 'No,Frequency [Hz],QP [dBuV],Limit [dBuV],Margin [dB]\n';
      const rows = table({ levels: 3 }).trimEnd().split('\n');
      const text = names + rows.map((row, i) => `${i},${row}`).join('\n');
      const { frequenciesHz, traces, inferred } = readDelimited(bytesOf(text));
      expect(frequenciesHz[0]).toBe(150_000);
      expect(traces.map(({ name }) => name)).toEqual(['QP']);
      expect(inferred.map(({ what, value }) => `${what}: ${value}`)).toEqual([
        'column 1: left out',
        'column 4: left out',
        'column 5: left out',
      ]);
    });

    it('refuses a second column of frequencies', () => {
      const fault = faultOf(`f [Hz],QP [dBuV],Frequency [Hz],AV [dBuV]\n${table({ levels: 3 })}`);
      expect(fault).toMatchObject({ line: 1, column: 3 });
    });
  });

  describe('files that are refused', () => {
    const broken = (row: number, text: string): string => {
      const rows = table().trimEnd().split('\n');
      rows[row] = text;
      return heading + rows.join('\n') + '\n';
    };

    it.each([
      ['an empty file', '', null, null, 'an empty file'],
      ['blank lines', ' \r\n\n', null, null, 'a file of blank lines only'],
      ['text', 'Dear all,\nno sweep today\n', 2, null, '"no sweep today"'],
      ['a heading alone', heading, 1, null, '"Frequency [Hz],Level [dBuV]"'],
      ['one column', '1\n2\n3\n', 1, null, '"1"'],
      ['nine points', heading + table({ points: 9 }), 2, null, '9 points'],
      ['a unit in a cell', broken(3, '163500,40.3 dBuV'), 5, 2, '"40.3 dBuV"'],
      ['letters in a number', broken(3, '12abc,40.3'), 5, 1, '"12abc"'],
      ['NaN', broken(3, '163500,NaN'), 5, 2, '"NaN"'],
      ['an empty cell', broken(3, '163500,'), 5, 2, 'an empty cell'],
      ['a missing column', broken(3, '163500'), 5, 2, '"163500"'],
      ['an extra column', broken(3, '163500,40.3,1'), 5, 3, '3 columns'],
      ['a blank line in the table', broken(3, ''), 5, null, 'a blank line within the table'],
      ['text behind the table', `${heading}${table()}[end]\n`, 22, 2, '"[end]"'],
      ['a first row that is broken', broken(0, '150000,n/a'), 2, 2, '"n/a"'],
      ['a first frequency that is broken', broken(0, 'NaN,40.0'), 2, 1, '"NaN"'],
      ['a first row with a column too few', `${heading}150000\n${table()}`, 2, 2, '"150000"'],
      ['a frequency of 0', broken(0, '0,40.0'), 2, 1, '0 Hz'],
      ['a negative frequency', broken(0, '-150000,40.0'), 2, 1, '-150000 Hz'],
      ['a falling frequency', broken(3, '150001,40.3'), 5, 1, '150001 Hz after 159000 Hz'],
      ['a repeated frequency', broken(3, '159000,40.3'), 5, 1, '159000 Hz after 159000 Hz'],
      ['an unbelievable level', broken(3, '163500,1e9'), 5, 2, 'a level of 1000000000 dBuV'],
      ['an endless level', broken(3, '163500,1e999'), 5, 2, 'a level of Infinity dBuV'],
      ['equal levels', heading + table().replace(/,.*/g, ',40.0'), 2, 2, 'the same level in all 20 rows'],
      ['swapped units', `f [Hz],QP [dBuV]\n${table({ unitHz: 1e6 })}`, 2, 1, 'a sweep from 0.15 Hz to 0.2355 Hz'],
      ['quoted numbers', broken(3, '"163500","40.3"'), 5, 1, '""163500""'],
    ])('names the place of %s', (_name, content, line, column, found) => {
      expect(faultOf(content)).toMatchObject({ line, column, found });
    });

    it.each([
      ['a picture', Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0, 0, 0, 13)],
      ['UTF-16', new Uint8Array(Buffer.from(heading + table(), 'utf16le'))],
    ])('refuses %s as binary', (_name, content) => {
      expect(faultOf(content).found).toContain('a binary file');
    });

    it('reads what is written or names a fault, whatever single byte of a file is damaged', () => {
      const sound = bytesOf(heading + table());
      const offset = fc.integer({ min: heading.length, max: sound.length - 1 });
      fc.assert(
        fc.property(offset, fc.integer({ min: 0, max: 255 }), (at, byte) => {
          const damaged = sound.slice();
          damaged[at] = byte;
          const text = Buffer.from(damaged.subarray(heading.length)).toString('latin1');
          const rows = text
            .trim()
            .split('\n')
            .map((row) => row.split(','));
          try {
            const { frequenciesHz, traces } = readDelimited(damaged);
            expect([...frequenciesHz]).toEqual(rows.map(([hz]) => Number(hz)));
            // A written -0 is read as 0.
            expect([...traces[0].levelsDbuv]).toEqual(rows.map(([, level]) => Math.fround(Number(level)) + 0));
          } catch (error) {
            if (!(error instanceof ReadingError)) throw error;
          }
        }),
        { numRuns: 2000 },
      );
    });

    it('reads or refuses any bytes with a fault of its own', () => {
      const words = fc.constantFrom(
        '1',
        '0.15',
        '45,3',
        ';',
        ',',
        '\t',
        '\n',
        'Hz',
        'dBuV',
        'f',
        ' ',
        '"',
        'e',
        '-',
        '#',
        ':',
      );
      const text = fc.array(words, { maxLength: 200 }).map((parts) => bytesOf(parts.join('')));
      fc.assert(
        fc.property(fc.oneof(text, fc.uint8Array({ maxLength: 400 })), (bytes) => {
          try {
            readDelimited(bytes, { levelUnit: 'dBuV' });
          } catch (error) {
            if (!(error instanceof ReadingError)) throw error;
          }
        }),
        { numRuns: 1000 },
      );
    });

    it('advises what to do', () => {
      expect(faultOf(broken(3, '163500,NaN')).advice).toBe('Leave points without a reading out of the file.');
      expect(faultOf(broken(3, '163500,40.3 dBuV')).advice).toBe('Write the unit once, in the heading.');
    });
  });
});
