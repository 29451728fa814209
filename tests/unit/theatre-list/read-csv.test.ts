import { describe, expect, it } from 'vitest';
import { readTheatreList } from '../../../src/domain/theatre-list/read-csv.ts';

const header =
  'Date,Position,Record number,Family name,Given name,Date of birth,Eye,Planned procedures,Allergies';
const list = (...lines: string[]) => readTheatreList([header, ...lines].join('\n'));

describe('readTheatreList', () => {
  it('makes a case of each row', () => {
    const { rows } = list(
      '2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,Left eye,vitrectomy; gas tamponade,penicillin',
    );
    expect(rows[0]?.errors).toEqual([]);
    expect(rows[0]?.case).toEqual({
      listDate: '2026-12-01',
      position: 1,
      record: {
        version: 1,
        who: {
          patient: {
            familyName: 'Oakhollow',
            givenName: 'Maren',
            dateOfBirth: '1961-03-14',
            number: 'DEMO-1',
            allergies: [{ substance: 'penicillin' }],
          },
          eye: 'left',
          planned: ['vitrectomy', 'gas'],
        },
      },
    });
  });

  it('tells no allergies from an empty cell', () => {
    const { rows } = list(
      '2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,left,,none',
      '2026-12-01,2,DEMO-2,Fernley,Ada,1950-01-02,right,,',
    );
    expect(rows[0]?.case?.record.who?.patient?.allergies).toBe('none');
    expect(rows[1]?.case?.record.who?.patient).not.toHaveProperty('allergies');
  });

  it.each([
    [
      '2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-02-30,left,,',
      'date of birth',
      'There is no such day in the calendar',
    ],
    ['2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,OD,,', 'eye', 'Write right or left'],
    ['1.12.2026,1,DEMO-1,Oakhollow,Maren,1961-03-14,left,,', 'date', 'Write the date as YYYY-MM-DD'],
    [
      '2026-12-01,0,DEMO-1,Oakhollow,Maren,1961-03-14,left,,',
      'position',
      'Write a whole number from 1 to 99',
    ],
    ['2026-12-01,1,,Oakhollow,Maren,1961-03-14,left,,', 'record number', 'Missing'],
    [
      '2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,left,hernia repair,',
      'planned procedures',
      '“hernia repair” is not among the procedures known here',
    ],
  ])('says what is wrong in its column: %s', (line, column, message) => {
    const { rows } = list(line);
    expect(rows[0]?.case).toBeUndefined();
    expect(rows[0]?.errors).toContainEqual({ column, message });
  });

  it('refuses the same case twice', () => {
    const line = '2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,left,,';
    const { rows } = list(line, line);
    expect(rows[0]?.case).toBeDefined();
    expect(rows[1]?.errors).toEqual([{ column: 'record number', message: 'The same case as on line 2' }]);
  });

  it('says what the file as a whole lacks', () => {
    expect(readTheatreList('').error).toMatch(/empty/);
    expect(readTheatreList('name;eye\na;b').error).toMatch(/lacks: date, record number/);
    expect(list().error).toMatch(/no cases/);
  });
});

describe('a file that does not hold together', () => {
  it('is refused whole when a quotation mark is left open: no line may vanish into another', () => {
    const { rows, error } = list(
      '2026-12-01,1,DEMO-1,"Oakhollow,Maren,1961-03-14,left,,',
      '2026-12-01,2,DEMO-2,A,B,1950-01-02,left,,',
    );
    expect(rows).toEqual([]);
    expect(error).toContain('quotation mark');
  });

  it('says which line has more cells than the header', () => {
    const { rows } = list('2026-12-01,1,DEMO-1,Oakhollow,Maren,1961-03-14,left,,latex, penicillin');
    expect(rows[0]?.case).toBeUndefined();
    expect(rows[0]?.errors[0]?.message).toContain('more cells than the header');
  });
});
