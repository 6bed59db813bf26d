/**
 * The flow as a service: its topics, its clock records, its engine, its accounts. Start from {@link
 * org.seamwatch.topology.service.StreamsService}.
 */
@NullMarked
package org.seamwatch.topology.service;

import org.jspecify.annotations.NullMarked;
