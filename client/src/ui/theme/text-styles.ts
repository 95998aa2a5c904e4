import { defineTextStyles } from '@chakra-ui/react';

const style = (fontSize: string, lineHeight: string, more: Record<string, unknown> = {}) => ({
  value: { fontSize, lineHeight, ...more },
});

/** Sizes and leading of the page; the smaller ones of narrow screens stand beside them. */
export const textStyles = defineTextStyles({
  title: style('54px', '58px', { fontWeight: 340, letterSpacing: '-0.032em' }),
  titleMedium: style('46px', '54px', { fontWeight: 340, letterSpacing: '-0.032em' }),
  titleSmall: style('38px', '42px', { fontWeight: 340, letterSpacing: '-0.032em' }),
  heading1: style('40px', '46px', { fontWeight: 340, letterSpacing: '-0.028em' }),
  heading1Small: style('32px', '38px', { fontWeight: 340, letterSpacing: '-0.028em' }),
  result: style('34px', '44px', { fontWeight: 340, letterSpacing: '-0.02em' }),
  resultSmall: style('26px', '34px', { fontWeight: 340, letterSpacing: '-0.02em' }),
  equation: style('31px', '40px', { letterSpacing: '-0.01em' }),
  equationSmall: style('26px', '36px', { letterSpacing: '-0.01em' }),
  evaluator: style('21px', '36px'),
  evaluatorSmall: style('19px', '36px'),
  lead: style('19px', '30px', { letterSpacing: '-0.005em' }),
  leadSmall: style('17px', '27px', { letterSpacing: '-0.005em' }),
  section: style('20px', '28px', { fontWeight: 600, letterSpacing: '-0.012em' }),
  subsection: style('15px', '24px', { fontWeight: 600 }),
  agenda: style('17px', '25px'),
  search: style('21px', '34px'),
  body: style('16px', '26px'),
  control: style('15px', '24px'),
  small: style('14px', '22px'),
  table: style('14px', '20px'),
  tableHead: style('13px', '18px', { fontWeight: 500 }),
  margin: style('13px', '20px'),
  caption: style('13px', '20px'),
  pasted: style('12.5px', '20px'),
  code: style('13px', '21px', { fontFamily: 'mono' }),
});
