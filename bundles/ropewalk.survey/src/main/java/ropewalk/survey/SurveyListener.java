package ropewalk.survey;

import org.osgi.annotation.versioning.ConsumerType;

/** Is told how a survey goes. Called from any thread. */
@ConsumerType
public interface SurveyListener {

    /**
     * Something the user should know.
     *
     * @param line what, where, what to do; one line
     */
    void message(String line);

    /**
     * How far the survey is. Called a few times a second at most.
     *
     * @param links rows written so far
     * @param bytesRead bytes of the files read so far
     * @param bytesInAll size of all files, 0 if unknown
     */
    void progress(long links, long bytesRead, long bytesInAll);
}
