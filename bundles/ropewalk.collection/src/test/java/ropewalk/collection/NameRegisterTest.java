package ropewalk.collection;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Against a set of strings. */
class NameRegisterTest {

    private static boolean occurred(NameRegister register, String name) {
        byte[] bytes = ("<" + name + ">").getBytes(StandardCharsets.UTF_8);
        return register.occurred(bytes, 1, bytes.length - 1);
    }

    @Test
    void agreesWithASetOnNamesThatAreNearlyAlike() {
        Random random = new Random(41);
        Set<String> names = new HashSet<>();
        NameRegister register = new NameRegister();
        for (int n = 0; n < 300_000; n++) {
            StringBuilder name = new StringBuilder();
            for (int k = random.nextInt(24); k > 0; k--) {
                name.append(random.nextInt(12) == 0 ? 'b' : random.nextInt(12) == 0 ? '\0' : 'a');
            }
            assertEquals(!names.add(name.toString()), occurred(register, name.toString()), "seed 41, case " + n);
        }
        assertEquals(names.size(), register.size());
    }

    @Test
    void remembersTheFirstMillion() {
        NameRegister register = new NameRegister();
        for (int n = 0; n < NameRegister.CAPACITY; n++) {
            assertFalse(occurred(register, "L" + n), "name " + n);
        }
        assertFalse(occurred(register, "late"));
        assertFalse(occurred(register, "late"));
        assertTrue(occurred(register, "L0"));
        assertTrue(occurred(register, "L999999"));
        assertEquals(NameRegister.CAPACITY, register.size());
    }

    @Test
    void zeroBytesAndLengthsCount() {
        NameRegister register = new NameRegister();
        for (int n = 0; n < 40; n++) {
            assertFalse(occurred(register, "\0".repeat(n)), "length " + n);
        }
        assertTrue(occurred(register, ""));
    }
}
