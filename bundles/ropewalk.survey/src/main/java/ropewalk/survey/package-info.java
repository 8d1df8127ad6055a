/**
 * Runs methods over collections: {@link ropewalk.survey.Survey} takes a {@link ropewalk.survey.SurveyRequest}, reads the
 * files, measures batches in parallel, writes the results in input order and hands back a
 * {@link ropewalk.survey.SurveyReport}.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.survey;
