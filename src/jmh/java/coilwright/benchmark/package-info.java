/**
 * Benchmarks: the search against scanning every coil count, warm, and whole runs of the program
 * against a bare Java start. Built and run only by the profile {@code benchmark}.
 */
package coilwright.benchmark;
