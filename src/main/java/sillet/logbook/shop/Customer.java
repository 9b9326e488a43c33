package sillet.logbook.shop;

import java.util.UUID;

/**
 * A person whose instruments come to the shop; kept apart from the instrument, so that the person
 * can be forgotten and the technical history stays.
 *
 * @param id identity
 * @param name as the person wants to be called
 * @param phone how to reach the person, may be empty
 * @param email how to reach the person, may be empty
 * @param note what the bench should know, may be empty
 */
public record Customer(UUID id, String name, String phone, String email, String note) {}
