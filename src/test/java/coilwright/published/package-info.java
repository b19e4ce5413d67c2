/**
 * Check values as publications print them: the files under {@code src/test/resources/published},
 * read by the tests of every room and counted by {@link coilwright.published.PublishedCountTest}.
 */
package coilwright.published;
