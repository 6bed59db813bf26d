package org.seamwatch.processors.intake;

import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RejectReason;

/**
 * Why a record cannot be used.
 *
 * @param reason the kind of fault
 * @param field the field at fault; empty where no single one is
 * @param detail the rule and the value in one sentence; goes to {@code rejected-reports} only
 */
public record Refusal(RejectReason reason, String field, String detail) {

    static Refusal from(ReadResult.Unusable<?> unusable) {
        return new Refusal(unusable.reason(), unusable.field(), unusable.detail());
    }
}
