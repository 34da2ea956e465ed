/**
 * What the rows of one problem amount to: which accuracy can be attained there, by whom, and by
 * whom at the least time. It is for a problem that stands alone, where verdicts over many say
 * nothing.
 */
package steelyard.results.attainment;
