/** The linking matrix, and the ties between components that it proves. Nothing here is exported. */
package ropewalk.invariant.linking.internal;
