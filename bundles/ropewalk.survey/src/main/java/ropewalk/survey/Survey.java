package ropewalk.survey;

import java.io.IOException;
import org.osgi.annotation.versioning.ProviderType;

/** Measures collections. A service; one run at a time for each output folder. */
@ProviderType
public interface Survey {

    /**
     * Runs a survey to its end.
     *
     * @param request what to measure
     * @param listener is told of messages and progress, on any thread
     * @return what came of it
     * @throws RequestException if the request cannot be carried out as it is; nothing was written then
     * @throws IOException if the results cannot be written
     */
    SurveyReport run(SurveyRequest request, SurveyListener listener) throws RequestException, IOException;

    /**
     * Asks all running surveys to stop after the rows that are ready, and waits for them to close their files.
     */
    void stop();

    /** A request that cannot be carried out; the message says why and what to do. */
    final class RequestException extends Exception {

        private static final long serialVersionUID = 1L;

        /**
         * A bad request.
         *
         * @param message what, and what to do, one line
         */
        public RequestException(String message) {
            super(message);
        }
    }
}
